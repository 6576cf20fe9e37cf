import type { RevisionAnswer } from '../../shared/api/drawings';

/**
 * How a draft stands to what the server has kept: a plain state machine, so that every way it can go is tested.
 * Text typed while a save is under way is never lost: it makes the next save.
 */
export type Keeping =
  /** What is shown is what is kept. */
  | { state: 'kept'; version: number; at: string | null }
  /** Typed, and waiting for a pause to be sent. */
  | { state: 'typed'; version: number }
  | { state: 'keeping'; version: number; typedSince: boolean }
  /** Not sent; held in this browser and sent again. `why` is `away` without a connection or a session. */
  | { state: 'held'; version: number; why: 'away' | 'refused'; message: string }
  /** Somebody else saved another version meanwhile. */
  | { state: 'stale'; version: number; theirs: RevisionAnswer };

export type KeepingEvent =
  | { event: 'typed' }
  | { event: 'sent' }
  | { event: 'answered'; version: number; at: string }
  | { event: 'failed'; why: 'away' | 'refused'; message: string }
  | { event: 'stale'; theirs: RevisionAnswer }
  /** The person chose between both; the next save goes on top of theirs. */
  | { event: 'settled'; version: number }
  /** The server's newest was taken in (an act changed it, or it was opened). */
  | { event: 'opened'; version: number; at: string | null };

export function keep(now: Keeping, event: KeepingEvent): Keeping {
  switch (event.event) {
    case 'opened':
      return { state: 'kept', version: event.version, at: event.at };
    case 'settled':
      return { state: 'typed', version: event.version };
    case 'typed':
      if (now.state === 'keeping') return { ...now, typedSince: true };
      // Both values stay on the table until the person has chosen.
      if (now.state === 'stale') return now;
      return { state: 'typed', version: now.version };
    case 'sent':
      return now.state === 'stale' ? now : { state: 'keeping', version: now.version, typedSince: false };
    case 'answered':
      if (now.state !== 'keeping') return now;
      return now.typedSince
        ? { state: 'typed', version: event.version }
        : { state: 'kept', version: event.version, at: event.at };
    case 'failed':
      return { state: 'held', version: now.version, why: event.why, message: event.message };
    case 'stale':
      return { state: 'stale', version: now.version, theirs: event.theirs };
  }
}

/** Whether closing the page now would lose nothing that the server does not have. */
export function isKept(now: Keeping): boolean {
  return now.state === 'kept';
}
