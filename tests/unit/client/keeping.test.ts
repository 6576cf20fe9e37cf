import { describe, expect, it } from 'vitest';
import type { RevisionAnswer } from '../../../shared/api/drawings';
import { keep, type Keeping, type KeepingEvent } from '../../../src/revision/keeping';

const kept: Keeping = { state: 'kept', version: 3, at: '2026-06-02T13:32:08Z' };
const after = (start: Keeping, ...events: KeepingEvent[]) => events.reduce(keep, start);
const theirs = { revision: { version: 7 } } as RevisionAnswer;

describe('keeping a draft', () => {
  it('goes from typed to kept with the version the server gives', () => {
    const done = after(
      kept,
      { event: 'typed' },
      { event: 'sent' },
      { event: 'answered', version: 4, at: 'now' },
    );
    expect(done).toEqual({ state: 'kept', version: 4, at: 'now' });
  });

  it('is not kept when something was typed while the save was under way', () => {
    const events: KeepingEvent[] = [
      { event: 'typed' },
      { event: 'sent' },
      { event: 'typed' },
      { event: 'answered', version: 4, at: 'now' },
    ];
    expect(after(kept, ...events)).toEqual({ state: 'typed', version: 4 });
  });

  it('holds what could not be sent, on the version it was typed on, and sends it again', () => {
    const held = after(
      kept,
      { event: 'typed' },
      { event: 'sent' },
      { event: 'failed', why: 'away', message: 'no' },
    );
    expect(held).toEqual({ state: 'held', version: 3, why: 'away', message: 'no' });
    expect(after(held, { event: 'sent' }, { event: 'answered', version: 4, at: 'now' }).state).toBe('kept');
    expect(after(held, { event: 'typed' }).state).toBe('typed');
  });

  it('sends nothing over somebody else’s version until the person has chosen', () => {
    const stale = after(kept, { event: 'typed' }, { event: 'sent' }, { event: 'stale', theirs });
    expect(stale.state).toBe('stale');
    expect(after(stale, { event: 'typed' }, { event: 'sent' })).toEqual(stale);
    expect(after(stale, { event: 'settled', version: 7 })).toEqual({ state: 'typed', version: 7 });
  });

  it('does not take a late answer for a save that is no longer under way', () => {
    const typed = after(kept, { event: 'typed' });
    expect(keep(typed, { event: 'answered', version: 9, at: 'late' })).toEqual(typed);
  });
});
