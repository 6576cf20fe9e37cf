import { pairPicture } from '../../shared/drawing/picture';
import { renderPicture } from '../../shared/render/svg';
import type { Route } from '../../shared/route/route';
import { setUpStages } from './set-up-stages';

/** Twice the room it has in a list, so that its lines come out fine. */
const SIZE = { width: 300, height: 96 } as const;

/** The work before and after the last set-up that cuts metal, small, as SVG for lists; null when none does. */
export function lastCardPicture(route: Route): string | null {
  const cutting = new Set(
    route.operations.filter((operation) => operation.cut).map((operation) => operation.setup),
  );
  const last = route.setups.filter((setup) => cutting.has(setup.id)).at(-1);
  const stages = last && setUpStages(route, last);
  return last && stages ? renderPicture(pairPicture(stages.before, stages.after, last, SIZE)) : null;
}
