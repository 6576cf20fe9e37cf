import { useCallback, useEffect, useReducer, useRef } from 'react';
import { useQueryClient } from '@tanstack/react-query';
import type { RevisionAnswer } from '../../shared/api/drawings';
import { ApiFault } from '../lib/api/fault';
import { revisionQuery, type RevisionAddress } from './api/revision';
import { saveRevision, staleAnswer } from './api/save-revision';
import type { Draft } from './draft';
import { holdDraft, releaseDraft } from './held-draft';
import { isKept, keep, type Keeping, type KeepingEvent } from './keeping';

/** A pause in typing this long is when a draft is sent. */
const PAUSE_MS = 700;
/** Without a connection it is tried again this often, and at once when the browser says it is back. */
const AGAIN_MS = 8_000;

export interface Keeper {
  keeping: Keeping;
  typed: (draft: Draft) => void;
  settle: (draft: Draft, onTopOf: RevisionAnswer) => void;
  /** Sends what waits now; resolves with the newest version once it is kept, null when it could not be. */
  flush: () => Promise<number | null>;
  /** Takes the server's newest in place of what is shown. */
  opened: (answer: RevisionAnswer) => void;
}

export function useKeeping(address: RevisionAddress, start: RevisionAnswer): Keeper {
  const queries = useQueryClient();
  const [keeping, dispatch] = useReducer(keep, start, ({ revision }): Keeping => ({
    state: 'kept',
    version: revision.version,
    at: revision.saved.at,
  }));
  // The newest state, ahead of the next drawing of the page: saves follow one another faster than that.
  const now = useRef(keeping);
  const draft = useRef<Draft | null>(null);
  const timer = useRef<number | undefined>(undefined);
  const sending = useRef<Promise<number | null> | null>(null);
  const { shop, drawing, revision } = address;

  const tell = useCallback((event: KeepingEvent) => {
    now.current = keep(now.current, event);
    dispatch(event);
  }, []);

  const send = useCallback((): Promise<number | null> => {
    window.clearTimeout(timer.current);
    if (sending.current) return sending.current;
    const run = async (): Promise<number | null> => {
      for (;;) {
        const { current: typed } = draft;
        if (!typed || isKept(now.current)) return now.current.version;
        if (now.current.state === 'stale') return null;
        tell({ event: 'sent' });
        try {
          const answer = await saveRevision(
            { shop, drawing, revision },
            { ...typed, version: now.current.version },
          );
          tell({ event: 'answered', version: answer.revision.version, at: answer.revision.saved.at });
          queries.setQueryData(revisionQuery({ shop, drawing, revision }).queryKey, answer);
          void queries.invalidateQueries({ queryKey: ['drawings', shop] });
          if (isKept(now.current)) releaseDraft(revision);
        } catch (fault) {
          const theirs = staleAnswer(fault);
          if (theirs) tell({ event: 'stale', theirs });
          else {
            const away =
              fault instanceof ApiFault &&
              (fault.noConnection || fault.status === 401 || fault.status >= 500);
            tell({ event: 'failed', why: away ? 'away' : 'refused', message: wordsOf(fault) });
            if (away) timer.current = window.setTimeout(() => void send(), AGAIN_MS);
          }
          return null;
        }
      }
    };
    sending.current = run().finally(() => {
      sending.current = null;
    });
    return sending.current;
  }, [shop, drawing, revision, queries, tell]);

  useEffect(() => {
    const again = () => {
      if (now.current.state === 'held') void send();
    };
    const leaving = (event: BeforeUnloadEvent) => {
      if (!isKept(now.current)) event.preventDefault();
    };
    window.addEventListener('online', again);
    window.addEventListener('benchleaf:signed-in', again);
    window.addEventListener('beforeunload', leaving);
    return () => {
      window.removeEventListener('online', again);
      window.removeEventListener('benchleaf:signed-in', again);
      window.removeEventListener('beforeunload', leaving);
      if (now.current.state === 'typed') void send();
      window.clearTimeout(timer.current);
    };
  }, [send]);

  const typed = useCallback(
    (next: Draft) => {
      draft.current = next;
      tell({ event: 'typed' });
      holdDraft(revision, { version: now.current.version, draft: next });
      window.clearTimeout(timer.current);
      timer.current = window.setTimeout(() => void send(), PAUSE_MS);
    },
    [revision, send, tell],
  );

  const settle = useCallback(
    (next: Draft, onTopOf: RevisionAnswer) => {
      draft.current = next;
      tell({ event: 'settled', version: onTopOf.revision.version });
      void send();
    },
    [send, tell],
  );

  const opened = useCallback(
    (answer: RevisionAnswer) => {
      window.clearTimeout(timer.current);
      draft.current = null;
      releaseDraft(revision);
      tell({ event: 'opened', version: answer.revision.version, at: answer.revision.saved.at });
    },
    [revision, tell],
  );

  return { keeping, typed, settle, flush: send, opened };
}

function wordsOf(fault: unknown): string {
  if (!(fault instanceof ApiFault)) return 'It could not be kept. It is held here.';
  const first = fault.fields[0];
  return first ? `${fault.message} ${first.path}: ${first.message}` : fault.message;
}
