import { moveMarks } from '../../../shared/drawing/move';
import { pairPicture } from '../../../shared/drawing/picture';
import type { Route, SetUp } from '../../../shared/route/route';
import { setUpStages } from '../../services/set-up-stages';
import { scaleMarks } from './scale-marks';
import type { CardPicture } from './setup-block';

/** Units a picture is laid out in, and what one is on paper (mm): its jaws and hatching are sized for a screen. */
const UNITS = { width: 220, height: 92, withoutStops: 76 } as const;
const MM_PER_UNIT = 0.25;

/** The work before and after a set-up, on one datum, as the card shows it; null for a set-up in which nothing is done. */
export function setUpPicture(route: Route, setup: SetUp): CardPicture | null {
  const stages = setUpStages(route, setup);
  if (!stages) return null;
  const stops = route.operations
    .filter((operation) => operation.setup === setup.id)
    .flatMap((operation) => operation.stops);
  const height = stops.length > 0 ? UNITS.height : UNITS.withoutStops;
  const picture = pairPicture(
    stages.before,
    stages.after,
    { ...setup, stops },
    { width: UNITS.width, height },
  );
  const marks = scaleMarks(
    picture.parts.flatMap((part) => part.marks),
    MM_PER_UNIT,
  );
  return {
    width: picture.width * MM_PER_UNIT,
    height: picture.height * MM_PER_UNIT,
    marks: (x, y) => moveMarks(marks, x, y),
  };
}
