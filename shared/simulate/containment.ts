import type { Body } from '../part/body';
import { STATION_TOLERANCE } from '../part/body';
import { maxInner, minOuter } from '../part/envelope';
import type { Difference } from '../part/same-metal';
import { differences } from '../part/same-metal';

/**
 * Where a stage has cut into the part: metal of the part that the stage no longer has. Both are intersections
 * of what their cuts allow, so the stage holds the part exactly when the part cut by the stage is the part.
 */
export function missingMetal(stage: Body, part: Body): Difference[] {
  const missing: Difference[] = [];
  const end = (from: number, to: number): void => {
    if (to - from > STATION_TOLERANCE) missing.push({ kind: 'ends', from, to, message: 'the end is gone' });
  };
  end(part.x0, stage.x0);
  end(stage.x1, part.x1);
  const cut: Body = {
    ...part,
    outer: minOuter(part.outer, stage.outer),
    inner: maxInner(part.inner, stage.inner),
    cuts: [...part.cuts, ...stage.cuts],
    treatments: [...part.treatments, ...stage.treatments],
  };
  return [...missing, ...differences(cut, part)];
}
