import type { Body, ThreadTreatment } from '../../part/body';
import { breaks, radiusAt } from '../../part/generator';
import { lineMark } from '../arrow';
import { boxAround } from '../geometry/box';
import { strokeBox, strokesOf } from '../strokes';
import { faceAngles, faceHalfWidth, flatsOf, reach } from '../profile';
import type { FlatsCut } from '../../part/body';
import type { Mark, PathCommand, Point } from '../sheet';

export type EndName = 'end-left' | 'end-right';

/** The end view about its own centre (0, 0), and what reaches how far. */
export interface EndView {
  name: EndName;
  marks: Mark[];
  /** Largest radius on paper. */
  radius: number;
  /** Normals of the flats on paper as the viewer sees them: angle from up, clockwise on paper positive. */
  normals: readonly { cut: string; angles: readonly number[]; distance: number }[];
}

const SAME = 1e-6;

/** True where some section is no circle: an end view says what the axis view cannot. */
export function needsEndView(body: Body): boolean {
  return flatsOf(body).length > 0;
}

/** Stations from the seen end inwards, each with the radius before and after it on the way in. */
function wayIn(
  body: Body,
  end: EndName,
): { x: number; near: number; far: number; before: FlatsCut[]; cuts: FlatsCut[] }[] {
  const stations = [...breaks(body.outer), ...flatsOf(body).flatMap((c) => [c.from, c.to])].filter(
    (x) => x >= body.x0 - SAME && x <= body.x1 + SAME,
  );
  const sorted = [...new Set(stations.map((x) => Math.round(x * 1e7) / 1e7))].sort((a, b) =>
    end === 'end-left' ? a - b : b - a,
  );
  return sorted.map((x, i) => {
    const nearSide = end === 'end-left' ? 'left' : 'right';
    const farSide = end === 'end-left' ? 'right' : 'left';
    const last = i === sorted.length - 1;
    const beyond = sorted[i + 1] ?? x;
    const middle = (x + beyond) / 2;
    const earlier = (x + (sorted[i - 1] ?? x)) / 2;
    const over = (at: number): FlatsCut[] => flatsOf(body).filter((c) => c.from <= at && at <= c.to);
    return {
      x,
      near: i === 0 ? 0 : radiusAt(body.outer, x, nearSide),
      far: last ? 0 : radiusAt(body.outer, x, farSide),
      before: i === 0 ? [] : over(earlier),
      cuts: last ? [] : over(middle),
    };
  });
}

/** How much of the flats can be seen from an end: the smaller the metal before them, the better. */
export function metalBefore(body: Body, end: EndName): number {
  const cut = flatsOf(body)[0];
  if (!cut) return 0;
  let largest = 0;
  for (const station of wayIn(body, end)) {
    largest = Math.max(largest, station.near);
    if (station.cuts.includes(cut)) return largest / cut.distance;
  }
  return largest / cut.distance;
}

/** Circles seen whole, and arcs of circles seen past the flats in front of them. */
interface Seen {
  circles: { r: number; thread?: ThreadTreatment }[];
  polygons: { cut: FlatsCut; r: number }[];
  arcs: { r: number; cut: FlatsCut }[];
}

function seenFrom(body: Body, end: EndName): Seen {
  const seen: Seen = { circles: [], polygons: [], arcs: [] };
  let circle = 0;
  let front: FlatsCut | null = null;
  let frontRadius = 0;
  const stations = wayIn(body, end);
  const meet = (r: number, cuts: readonly FlatsCut[], x: number): void => {
    const cut = cuts.find((c) => r > c.distance + SAME);
    if (cut && front !== cut) {
      if (circle < cut.distance + SAME || r > circle + SAME) seen.polygons.push({ cut, r });
      front = cut;
      frontRadius = Math.max(frontRadius, r);
      return;
    }
    if (cut) {
      frontRadius = Math.max(frontRadius, r);
      return;
    }
    if (r <= circle + SAME) return;
    const polygon: FlatsCut | null = front;
    if (polygon) {
      const sharp = polygon.count >= 3 ? polygon.distance / Math.cos(Math.PI / polygon.count) : Infinity;
      const corner = Math.min(frontRadius, sharp);
      if (r <= polygon.distance + SAME) return;
      if (r < corner - SAME || Math.abs(r - corner) < SAME) {
        // Behind the flats, seen past them; where it meets the milled corners it is the same line.
        seen.arcs.push({ r, cut: polygon });
        circle = Math.max(circle, r);
        return;
      }
    }
    const thread = body.treatments.find(
      (t): t is ThreadTreatment =>
        t.kind === 'thread' && !t.internal && x >= t.from - SAME && x <= t.to + SAME,
    );
    seen.circles.push(thread && Math.abs(thread.major / 2 - r) < SAME ? { r, thread } : { r });
    circle = r;
  };
  for (const station of stations) {
    meet(station.near, station.before, station.x);
    meet(station.far, station.cuts, station.x);
  }
  return seen;
}

/** Paper direction of a part direction seen from one end: y up stays up; the front (z) lies to the right from the left end. */
function onPaper(end: EndName, angle: number): { ux: number; uy: number } {
  const side = end === 'end-left' ? 1 : -1;
  return { ux: side * Math.sin(angle), uy: -Math.cos(angle) };
}

function polygonPath(cut: FlatsCut, r: number, end: EndName, scale: number): Mark {
  const w = faceHalfWidth(cut, r);
  const sharp = cut.count >= 3 && r >= cut.distance / Math.cos(Math.PI / cut.count) - SAME;
  const commands: PathCommand[] = [];
  const clockwise = end === 'end-left';
  faceAngles(cut).forEach((angle, k) => {
    const { ux, uy } = onPaper(end, angle);
    // Along the face in the sense in which the angle grows.
    const tx = clockwise ? -uy : uy;
    const ty = clockwise ? ux : -ux;
    const point = (s: number): Point => ({
      x: (cut.distance * ux + s * tx) * scale,
      y: (cut.distance * uy + s * ty) * scale,
    });
    const a = point(-w);
    const b = point(w);
    if (k === 0) commands.push({ op: 'M', ...a });
    else if (!sharp)
      commands.push({
        op: 'A',
        r: r * scale,
        large: cut.count === 1 ? 1 : 0,
        sweep: clockwise ? 1 : 0,
        ...a,
      });
    commands.push({ op: 'L', ...b });
    if (k === cut.count - 1 && !sharp && commands[0]?.op === 'M')
      commands.push({
        op: 'A',
        r: r * scale,
        large: cut.count === 1 ? 1 : 0,
        sweep: clockwise ? 1 : 0,
        x: commands[0].x,
        y: commands[0].y,
      });
  });
  commands.push({ op: 'Z' });
  return { type: 'path', line: 'visible', commands };
}

function arcsPast(r: number, cut: FlatsCut, end: EndName, scale: number, merge: number): Mark[] {
  if ((r - cut.distance) * scale < merge) return [];
  const half = Math.acos(cut.distance / r);
  return faceAngles(cut).map((angle): Mark => {
    const at = (turn: number): Point => {
      const { ux, uy } = onPaper(end, angle + turn);
      return { x: r * ux * scale, y: r * uy * scale };
    };
    return {
      type: 'path',
      line: 'visible',
      commands: [
        { op: 'M', ...at(-half) },
        { op: 'A', r: r * scale, large: 0, sweep: end === 'end-left' ? 1 : 0, ...at(half) },
      ],
    };
  });
}

/** Three quarters of a circle at the root of a thread, open at the upper right (ISO 6410-1). */
function rootCircle(r: number): Mark {
  const a = 0.12;
  const from = { x: r * Math.cos(a), y: r * Math.sin(a) };
  const to = { x: -r * Math.sin(a) * -1, y: -r * Math.cos(a) };
  return {
    type: 'path',
    line: 'thin',
    commands: [
      { op: 'M', ...from },
      { op: 'A', r, large: 1, sweep: 1, ...to },
    ],
  };
}

/** What is seen looking at one end: every visible circle once, flats with their rounded corners, thread root, centre lines. */
export function endView(body: Body, end: EndName, scale: number, merge: number, past: number): EndView {
  const seen = seenFrom(body, end);
  const marks: Mark[] = [];
  const threaded = seen.circles.find((c) => c.thread);
  const drawn: number[] = [];
  const outside = Math.max(
    ...seen.circles.map((c) => c.r),
    ...seen.polygons.map((p) =>
      Math.max(
        reach(p.r, [p.cut]).top,
        Math.min(p.r, p.cut.count >= 3 ? p.cut.distance / Math.cos(Math.PI / p.cut.count) : p.r),
      ),
    ),
    0,
  );
  // From the outside in, so that where two would blot it is the inner one that is left out.
  for (const { r, thread } of [...seen.circles].sort((a, b) => b.r - a.r)) {
    const paper = r * scale;
    if (
      threaded &&
      threaded.r > r + SAME &&
      threaded.thread &&
      r > threaded.thread.root / 2 - threaded.thread.pitch
    )
      continue;
    if (paper < 0.4 || drawn.some((d) => Math.abs(d - paper) < merge)) continue;
    if (seen.polygons.some((p) => Math.abs(p.cut.distance * scale - paper) < merge * 0.7)) continue;
    marks.push({ type: 'circle', line: 'visible', cx: 0, cy: 0, r: paper });
    drawn.push(paper);
    if (thread) {
      const root = Math.min(thread.root / 2, r - merge / scale) * scale;
      if (root > 0.6) marks.push(rootCircle(root));
      drawn.push(root);
    }
  }
  for (const { cut, r } of seen.polygons) marks.push(polygonPath(cut, r, end, scale));
  for (const { r, cut } of seen.arcs) marks.push(...arcsPast(r, cut, end, scale, merge));
  const radius = outside * scale;
  const box = boxAround(strokesOf(marks).map(strokeBox)) ?? [-radius, -radius, radius, radius];
  marks.push(
    lineMark('centre', box[0] - past, 0, box[2] + past, 0),
    lineMark('centre', 0, box[1] - past, 0, box[3] + past),
  );
  const normals = seen.polygons.map(({ cut }) => ({
    cut: cut.id,
    angles: faceAngles(cut).map((a) => (end === 'end-left' ? a : -a)),
    distance: cut.distance,
  }));
  return { name: end, marks, radius, normals };
}
