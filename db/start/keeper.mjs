/**
 * Ends what its parent started when the parent is gone without having done so (killed outright, out of memory).
 * It reads one JSON line an order from the pipe that is its standard input: { watch, signal, group } or { forget }.
 * The pipe closes when the parent dies, however it dies; only then does the keeper act.
 */
import { createInterface } from 'node:readline';
import { readFileSync, rmSync } from 'node:fs';

const GRACE_MS = 10_000;
const watched = new Map();
const folders = new Set();

const orders = createInterface({ input: process.stdin });
orders.on('line', (line) => {
  const order = JSON.parse(line);
  if (order.watch) watched.set(order.watch, order);
  if (order.forget) watched.delete(order.forget);
  if (order.removeFolder) folders.add(order.removeFolder);
});
orders.on('close', async () => {
  // Last started, first ended: a server before the database it talks to.
  for (const order of [...watched.values()].reverse()) await end(order);
  for (const folder of folders) rmSync(folder, { recursive: true, force: true });
  process.exit(0);
});

for (const signal of ['SIGINT', 'SIGTERM', 'SIGHUP']) process.on(signal, () => {});

async function end({ watch: pid, signal, group }) {
  const target = group ? -pid : pid;
  if (!send(target, signal)) return;
  for (let waited = 0; waited < GRACE_MS; waited += 50) {
    if (!send(target, 0)) return;
    if (isOver(pid)) {
      if (group) send(-pid, 'SIGKILL');
      return;
    }
    await new Promise((done) => setTimeout(done, 50));
  }
  send(-pid, 'SIGKILL');
}

/** Ended, but not yet collected by whoever inherited it: signals still reach it, so it would be waited for in vain. */
function isOver(pid) {
  try {
    return /\) Z /.test(readFileSync(`/proc/${pid}/stat`, 'latin1'));
  } catch {
    return false;
  }
}

function send(target, signal) {
  try {
    process.kill(target, signal);
    return true;
  } catch {
    return false;
  }
}
