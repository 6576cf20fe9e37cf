import type { RevisionState } from '../../shared/api/drawings';
import type { Role } from '../../shared/api/session';
import { Refusal } from '../errors';
import type { Act, ActId, Scope } from './act-table';
import { actTable } from './act-table';

/** Who asks. `selfRelease`: the shop's lead may approve their own, since nobody else can check. */
export interface Asker {
  roles: readonly Role[];
  selfRelease: boolean;
}

/** The revision asked about, as the asker stands to it. */
export interface Matter {
  state: RevisionState;
  trial: boolean;
  /** The asker wrote or edited it. */
  own: boolean;
}

/** Allowed, or why not: by role, because it is their own work, or by the revision's state. */
export type Verdict = 'allowed' | 'role' | 'own-work' | 'state';

const acts: ReadonlyMap<string, Act> = new Map(actTable.map((act): [string, Act] => [act.id, act]));

/** Judges one act. An act on a revision needs the `matter`; one on the shop has none. */
export function judge(id: ActId, asker: Asker, matter?: Matter): Verdict {
  const act = acts.get(id);
  if (!act) throw new Error(`The act table has no act "${id}".`);
  const verdicts = asker.roles.map((role) => scopeAllows(act.roles[role], role, asker, matter));
  // Own work cannot be approved through another role that one also holds: every such scope asks the same of it.
  if (!verdicts.includes('allowed')) return verdicts.includes('own-work') ? 'own-work' : 'role';
  return !act.states || (matter && act.states.includes(matter.state)) ? 'allowed' : 'state';
}

function scopeAllows(scope: Scope, role: Role, asker: Asker, matter?: Matter): Verdict {
  switch (scope) {
    case 'any':
      return 'allowed';
    case 'never':
      return 'role';
    case 'own':
      return matter?.own ? 'allowed' : 'role';
    case 'trial':
      return matter?.trial && matter.state === 'draft' ? 'allowed' : 'role';
    case 'not-own':
      if (!matter) return 'role';
      return !matter.own || (role === 'lead' && asker.selfRelease) ? 'allowed' : 'own-work';
  }
}

/** @throws Refusal saying whether role, own work or state stands in the way. */
export function permit(id: ActId, asker: Asker, matter?: Matter): void {
  const verdict = judge(id, asker, matter);
  if (verdict === 'allowed') return;
  if (verdict === 'own-work') throw new Refusal('own-work');
  throw new Refusal(verdict === 'state' ? 'wrong-state' : 'forbidden');
}

/** Whether the asker may read that revision at all. */
export function mayRead(asker: Asker, matter: Matter): boolean {
  return (
    judge('read-published', asker, matter) === 'allowed' || judge('read-open', asker, matter) === 'allowed'
  );
}
