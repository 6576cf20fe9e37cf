/** One start at a time on one data folder. */
import { createHash } from 'node:crypto';
import { createConnection, createServer } from 'node:net';
import { Fault } from './fault.mjs';

/**
 * Claims the data folder for this process; a second claim is a Fault that names the first.
 * The claim is a name in Linux's abstract socket space: the kernel lets it go when we die, so it is never stale.
 * @returns {Promise<{ announce: (address: string) => void }>}
 */
export async function claimFolder(dataFolder) {
  const name = `\0benchleaf-${createHash('sha256').update(dataFolder).digest('hex').slice(0, 32)}`;
  let address = '';
  const server = createServer((socket) => {
    socket.on('error', () => {});
    socket.end(JSON.stringify({ pid: process.pid, address }));
  });
  await new Promise((resolve, reject) => {
    server.once('error', reject);
    server.listen(name, resolve);
  }).catch(async (error) => {
    if (error.code !== 'EADDRINUSE') throw error;
    const holder = await askHolder(name);
    throw new Fault(
      holder?.address
        ? `Benchleaf already runs on ${dataFolder}: it answers at ${holder.address} (process ${holder.pid}).`
        : `Benchleaf is already being started on ${dataFolder}${holder?.pid ? ` (process ${holder.pid})` : ''}. Wait for it, or end it first.`,
    );
  });
  server.unref();
  return { announce: (where) => (address = where) };
}

function askHolder(name) {
  return new Promise((resolve) => {
    let text = '';
    const socket = createConnection(name);
    socket.setTimeout(1000, () => socket.destroy());
    socket.on('data', (chunk) => (text += chunk));
    socket.on('error', () => {});
    socket.on('close', () => {
      try {
        resolve(JSON.parse(text));
      } catch {
        resolve(undefined);
      }
    });
  });
}
