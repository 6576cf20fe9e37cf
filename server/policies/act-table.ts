import type { RevisionState } from '../../shared/api/drawings';
import type { Role } from '../../shared/api/session';

/**
 * any = always within the shop; own = wrote or edited that revision; not-own = did not; trial = a draft marked as
 * trial piece only; never.
 */
export type Scope = 'any' | 'own' | 'not-own' | 'trial' | 'never';

export interface Act {
  /** Stable; goes out to the client as the name of an ability. */
  id: string;
  /** What the act is, in the words of the shop. */
  text: string;
  roles: Readonly<Record<Role, Scope>>;
  /** States of a revision in which it is possible; absent for acts on the shop. */
  states?: readonly RevisionState[];
}

const published = ['released', 'superseded', 'withdrawn'] as const;
const open = ['draft', 'in review'] as const;

type Scopes = readonly [reader: Scope, machinist: Scope, designer: Scope, checker: Scope, lead: Scope];

function act<Id extends string>(
  id: Id,
  text: string,
  scopes: Scopes,
  states?: readonly RevisionState[],
): Act & { id: Id } {
  const [reader, machinist, designer, checker, lead] = scopes;
  return { id, text, roles: { reader, machinist, designer, checker, lead }, states };
}

/** Who may do what: the one table that the server's rules and the abilities in its answers are made from. */
export const actTable = [
  act(
    'read-published',
    'read and print released sheets, routes, verdicts',
    ['any', 'any', 'any', 'any', 'any'],
    published,
  ),
  act('read-open', 'read drafts and revisions in review', ['never', 'trial', 'any', 'any', 'any'], open),
  act('start-drawing', 'start a drawing', ['never', 'never', 'any', 'never', 'any']),
  act('start-revision', 'start a new revision', ['never', 'never', 'any', 'never', 'any'], ['released']),
  act('edit', 'fill in and save a draft', ['never', 'never', 'any', 'never', 'any'], ['draft']),
  act('trial', 'mark a draft as trial piece', ['never', 'never', 'any', 'never', 'any'], ['draft']),
  act('submit', 'send a draft for checking', ['never', 'never', 'own', 'never', 'any'], ['draft']),
  act(
    'take-back',
    'take a revision back from checking',
    ['never', 'never', 'own', 'never', 'any'],
    ['in review'],
  ),
  act('return', 'return a revision with reasons', ['never', 'never', 'never', 'any', 'any'], ['in review']),
  act('approve', 'approve, which releases', ['never', 'never', 'never', 'not-own', 'not-own'], ['in review']),
  act('withdraw', 'withdraw a released revision', ['never', 'never', 'never', 'never', 'any'], ['released']),
  act('read-register', 'read the register', ['any', 'any', 'any', 'any', 'any']),
  act('people', 'see people and their roles', ['never', 'never', 'never', 'never', 'any']),
  act('settings', 'change the settings of the shop', ['never', 'never', 'never', 'never', 'any']),
  act('audit', 'read the audit trail', ['never', 'never', 'never', 'never', 'any']),
] as const;

export type ActId = (typeof actTable)[number]['id'];
