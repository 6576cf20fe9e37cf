import type { Body } from '../part/body';
import { radiusAt } from '../part/generator';
import { lineMark } from './arrow';
import { axisCentreLine, axisOutline } from './passes/axis-outline';
import { flatsEdges, shoulderEdges, threadMarks } from './passes/axis-edges';
import { moveMarks } from './move';
import { profileOf, reach, flatsOf } from './profile';
import type { Mark, Point } from './sheet';
import type { XMap } from './x-map';
import { toPaper } from './x-map';

/** Marks of one kind: `metal`, `axis`, `held`, `cut`, `centre` or `stops`. */
export interface PicturePart {
  class: string;
  marks: readonly Mark[];
}

const MERGE = 2;
const SAMPLES = 240;
const CHANGED = 1e-4;

/** The profile and its centre line, axis at `y`, left end of the map at `left`. */
export function profileMarks(body: Body, map: XMap, left: number, y: number): PicturePart[] {
  const profile = profileOf(body);
  const edges = { body, map, merge: MERGE };
  const metal = [
    ...axisOutline(profile, map).marks,
    ...shoulderEdges(profile, edges),
    ...flatsEdges(edges),
    ...threadMarks(edges),
  ];
  const own: XMap = {
    ...map,
    knots: [
      [body.x0, toPaper(map.knots, body.x0)],
      [body.x1, toPaper(map.knots, body.x1)],
    ],
  };
  return [
    { class: 'metal', marks: moveMarks(metal, left, y) },
    { class: 'axis', marks: moveMarks([axisCentreLine(own, 3)], left, y) },
  ];
}

function upperAt(body: Body, x: number): number {
  if (x < body.x0 || x > body.x1) return 0;
  const r = radiusAt(body.outer, x, 'right');
  return reach(
    r,
    flatsOf(body).filter((c) => c.from <= x && x <= c.to),
  ).top;
}

/** What this set-up has cut, as heavy edges of the work after it. */
export function changedEdges(before: Body, after: Body, map: XMap, left: number, y: number): PicturePart[] {
  const marks: Mark[] = [];
  let run: Point[] = [];
  const flush = (): void => {
    if (run.length > 1) {
      marks.push({ type: 'polyline', line: 'visible', points: run });
      marks.push({ type: 'polyline', line: 'visible', points: run.map((p) => ({ x: p.x, y: -p.y })) });
    }
    run = [];
  };
  const stations = [
    ...after.outer.flatMap((p) => [p.from, p.to]),
    ...flatsOf(after).flatMap((c) => [c.from, c.to]),
  ];
  for (let i = 0; i <= SAMPLES; i++) stations.push(after.x0 + ((after.x1 - after.x0) * i) / SAMPLES);
  const sorted = [...new Set(stations)].filter((x) => x >= after.x0 && x <= after.x1).sort((p, q) => p - q);
  sorted.forEach((x, i) => {
    const next = sorted[i + 1];
    if (next === undefined) return;
    const middle = (x + next) / 2;
    const changed =
      newCutAt(before, after, middle) || upperAt(before, middle) - upperAt(after, middle) > CHANGED;
    if (!changed) {
      flush();
      return;
    }
    const inset = Math.min(1e-7, (next - x) / 4);
    const a = { x: toPaper(map.knots, x), y: -upperAt(after, x + inset) * map.scale };
    const b = { x: toPaper(map.knots, next), y: -upperAt(after, next - inset) * map.scale };
    run.push(a, b);
  });
  flush();
  const faces: Mark[] = [
    ...(after.x0 > before.x0 + CHANGED ? [face(after, after.x0 + 1e-7, after.x0, map)] : []),
    ...(after.x1 < before.x1 - CHANGED ? [face(after, after.x1 - 1e-7, after.x1, map)] : []),
  ];
  const all = [...marks, ...faces];
  return all.length > 0 ? [{ class: 'cut', marks: moveMarks(all, left, y) }] : [];
}

function newCutAt(before: Body, after: Body, x: number): boolean {
  const over = (b: Body): number =>
    [
      ...b.cuts.filter((c) => 'from' in c && c.from <= x && x <= c.to),
      ...b.treatments.filter((t) => t.from <= x && x <= t.to),
    ].length;
  return over(after) > over(before);
}

function face(body: Body, inside: number, x: number, map: XMap): Mark {
  const r = upperAt(body, inside) * map.scale;
  const px = toPaper(map.knots, x);
  return lineMark('visible', px, -r, px, r);
}

/** Hatched jaws over and under the held length. */
export function heldParts(
  body: Body,
  map: XMap,
  left: number,
  y: number,
  grip: { from: number; to: number },
  thick: number,
): PicturePart[] {
  if (grip.to - grip.from < 1e-6) return [];
  const r =
    Math.max(
      upperAt(body, grip.from + 1e-6),
      upperAt(body, grip.to - 1e-6),
      upperAt(body, (grip.from + grip.to) / 2),
    ) * map.scale;
  const x0 = left + toPaper(map.knots, grip.from);
  const x1 = left + toPaper(map.knots, grip.to);
  const marks = [-1, 1].flatMap((way): Mark[] => {
    const near = y + way * (r + 0.6);
    const far = y + way * (r + 0.6 + thick);
    const [top, bottom] = [Math.min(near, far), Math.max(near, far)];
    return [
      {
        type: 'polyline',
        line: 'thin',
        closed: true,
        points: [
          { x: x0, y: top },
          { x: x1, y: top },
          { x: x1, y: bottom },
          { x: x0, y: bottom },
        ],
      },
      ...hatch(x0, x1, top, bottom),
    ];
  });
  return [{ class: 'held', marks }];
}

function hatch(x0: number, x1: number, top: number, bottom: number): Mark[] {
  const tall = bottom - top;
  const marks: Mark[] = [];
  for (let x = x0 - tall + 3; x < x1; x += 3) {
    const from = Math.max(x, x0);
    const to = Math.min(x + tall, x1);
    if (to > from) marks.push(lineMark('hatch', from, bottom - (from - x), to, bottom - (to - x)));
  }
  return marks;
}

/** The tail centre as an outline, its point in the work's end at (x, y). */
export function tailCentre(x: number, y: number): PicturePart {
  return {
    class: 'centre',
    marks: [
      {
        type: 'polyline',
        line: 'thin',
        points: [
          { x: x + 15, y: y - 4 },
          { x: x + 6, y: y - 4 },
          { x, y },
          { x: x + 6, y: y + 4 },
          { x: x + 15, y: y + 4 },
        ],
      },
    ],
  };
}
