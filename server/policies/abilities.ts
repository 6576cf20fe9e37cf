import type { Abilities } from '../../shared/api/drawings';
import type { ActId } from './act-table';
import { actTable } from './act-table';
import type { Asker, Matter } from './permit';
import { judge, mayRead } from './permit';

/** Acts on the shop that the asker may do, by name. */
export function shopAbilities(asker: Asker): Abilities {
  return named(
    actTable.filter((act) => !act.states).map((act) => act.id),
    (id) => judge(id, asker) === 'allowed',
  );
}

/** Acts on that revision that the asker may do now. `start-revision` is false while the drawing has an open one. */
export function revisionAbilities(asker: Asker, matter: Matter, drawing: { open: boolean }): Abilities {
  const abilities = named(
    actTable.filter((act) => act.states).map((act) => act.id),
    (id) => judge(id, asker, matter) === 'allowed',
  );
  return {
    ...abilities,
    read: mayRead(asker, matter),
    'start-revision': abilities['start-revision'] === true && !drawing.open,
  };
}

function named(ids: readonly ActId[], may: (id: ActId) => boolean): Abilities {
  return Object.fromEntries(ids.map((id) => [id, may(id)]));
}
