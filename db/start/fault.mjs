/**
 * A failure somebody can act on. The message is whole sentences: what was found, and what to do.
 * Whoever catches it prints the message alone and leaves with code 1.
 */
export class Fault extends Error {}

/** Thrown by a step that is cut short because everything is being ended. */
export class Ending extends Error {}

/** What the operating system refused, as a sentence; `doing` is a phrase such as "write to /srv/.data". */
export function sentenceFor(error, doing) {
  const reason =
    {
      EACCES: 'this user is not allowed to',
      EPERM: 'this user is not allowed to',
      EROFS: 'the file system is read-only',
      ENOSPC: 'the disk is full',
      EDQUOT: 'the disk quota is used up',
      ENOTDIR: 'a part of that path is a file, not a folder',
      EEXIST: 'a file of that name is in the way',
      ENOENT: 'it does not exist',
      EMFILE: 'too many files are open',
    }[error?.code] ?? firstLine(error?.message ?? String(error));
  return `Could not ${doing}: ${reason}.`;
}

/** Runs a step on files; what the system refuses becomes a Fault with a sentence. */
export function orFault(doing, step, advice = '') {
  try {
    return step();
  } catch (error) {
    if (error instanceof Fault) throw error;
    throw new Fault(advice ? `${sentenceFor(error, doing)} ${advice}` : sentenceFor(error, doing));
  }
}

export function firstLine(text) {
  return (
    String(text)
      .split('\n')
      .find((line) => line.trim() !== '')
      ?.trim()
      .replace(/\.$/, '') ?? 'no reason was given'
  );
}
