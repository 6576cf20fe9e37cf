/** Ends with npm: killed outright, npm tells nobody, and what it started would go on for ever. */
import { readFileSync } from 'node:fs';

const LOOK_EVERY_MS = 500;

/**
 * Calls back once when the npm that started us has gone. Does nothing for a start without npm: a start script may well
 * leave its children running on purpose.
 */
export function whenParentIsGone(callback) {
  if (!process.env.npm_lifecycle_event) return;
  const line = ancestors();
  const npm = line.find(({ command }) => command.includes('npm'));
  if (!npm) return;
  const watched = line.slice(0, line.indexOf(npm) + 1);
  const timer = setInterval(() => {
    if (
      process.ppid === watched[0].pid &&
      watched.every(({ pid, began }) => readProcess(pid)?.began === began)
    )
      return;
    clearInterval(timer);
    callback();
  }, LOOK_EVERY_MS);
  timer.unref();
}

/** Parent, grandparent and so on, up to four. */
function ancestors() {
  const found = [];
  for (let pid = process.ppid; pid > 1 && found.length < 4;) {
    const entry = readProcess(pid);
    if (!entry) break;
    found.push(entry);
    pid = entry.parent;
  }
  return found;
}

/** A process with the moment it began, which tells it from a later one that was given the same number. */
function readProcess(pid) {
  try {
    const stat = readFileSync(`/proc/${pid}/stat`, 'latin1');
    const fields = stat.slice(stat.lastIndexOf(')') + 2).split(' ');
    if (fields[0] === 'Z') return undefined;
    const command = readFileSync(`/proc/${pid}/cmdline`, 'latin1').replaceAll('\0', ' ');
    return { pid, parent: Number(fields[1]), began: fields[19], command };
  } catch {
    return undefined;
  }
}
