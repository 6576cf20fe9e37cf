import type { Body, FlatsCut, ThreadTreatment } from '../../part/body';
import { radiusAt } from '../../part/generator';
import type { Part } from '../../part/part';
import { lineMark } from '../arrow';
import { faceAngles, faceHalfWidth, flatsOf, reach } from '../profile';
import type { ProfileSpan } from '../profile';
import type { Mark, Point } from '../sheet';
import { toPaper } from '../x-map';
import type { XMap } from '../x-map';

const SAME = 1e-6;
/** Where curves part for good, mm on paper: under the width of a line they would print as one thick one. */
const PARTING = 0.4;
/** An edge leaves the line it was one with over so many times the gap, so that it seems to bend away and not to jump. */
const EASE = 5;
/** A bend of the outline under this (radians) is no edge. */
const LEAST_BEND = 0.01;

interface Edges {
  body: Body;
  map: XMap;
  merge: number;
}

/** Slope of the silhouette at one end of a span. */
function slopeAt(span: ProfileSpan, end: 'start' | 'end'): number {
  if (span.arc) {
    const x = end === 'start' ? span.from : span.to;
    const r = radiusAt([span.arc], x) - span.arc.centreR;
    return r === 0 ? -Infinity : -(x - span.arc.centreX) / r;
  }
  const n = span.points.length;
  const [a, b] =
    end === 'start' ? [span.points[0], span.points[1]] : [span.points[n - 2], span.points[n - 1]];
  return a && b && b.x > a.x ? (b.top - a.top) / (b.x - a.x) : 0;
}

/** Pieces of the circle of radius r that the viewer sees as a straight edge, less what flats have taken, as heights. */
function seenEdge(r: number, cuts: readonly FlatsCut[]): (readonly [number, number])[] {
  let arcs: [number, number][] = [[0, Math.PI]];
  for (const cut of cuts) {
    if (r <= cut.distance + SAME) continue;
    const half = Math.acos(cut.distance / r);
    for (const angle of faceAngles(cut))
      for (const turn of [-2 * Math.PI, 0, 2 * Math.PI]) {
        const lo = angle + turn - half;
        const hi = angle + turn + half;
        arcs = arcs.flatMap(([a, b]): [number, number][] => {
          if (hi <= a || lo >= b) return [[a, b]];
          const kept: [number, number][] = [];
          if (lo > a) kept.push([a, lo]);
          if (hi < b) kept.push([hi, b]);
          return kept;
        });
      }
  }
  return arcs.map(([a, b]) => [r * Math.cos(b), r * Math.cos(a)]);
}

function cutsTouching(body: Body, x: number): FlatsCut[] {
  return flatsOf(body).filter((cut) => x >= cut.from - SAME && x <= cut.to + SAME);
}

/** Edges square to the axis: every shoulder, chamfer edge, cone's end and crown's edge. */
export function shoulderEdges(profile: readonly ProfileSpan[], { body, map, merge }: Edges): Mark[] {
  const marks: Mark[] = [];
  for (let i = 0; i + 1 < profile.length; i++) {
    const left = profile[i];
    const right = profile[i + 1];
    const a = left?.points[left.points.length - 1];
    const b = right?.points[0];
    if (!left || !right || !a || !b) continue;
    const x = toPaper(map.knots, left.to);
    const r = radiusAt(body.outer, left.to, 'left');
    const stepped = Math.abs(r - radiusAt(body.outer, left.to, 'right')) > SAME;
    if (stepped) {
      marks.push(
        lineMark(
          'visible',
          x,
          -Math.min(a.top, b.top) * map.scale,
          x,
          Math.min(a.bottom, b.bottom) * map.scale,
        ),
      );
      continue;
    }
    if (Math.abs(a.top - b.top) > SAME || Math.abs(a.bottom - b.bottom) > SAME) continue;
    const bend = Math.abs(Math.atan(slopeAt(left, 'end')) - Math.atan(slopeAt(right, 'start')));
    if (bend < LEAST_BEND) continue;
    // A chamfer or a crown this flat on paper would print its edge and its end as one blot.
    if (Math.min(left.to - left.from, right.to - right.from) * map.scale < merge) continue;
    for (const [low, high] of seenEdge(r, cutsTouching(body, left.to)))
      if ((high - low) * map.scale >= merge)
        marks.push(lineMark('visible', x, -high * map.scale, x, -low * map.scale));
  }
  return marks;
}

/** Walls in which flats end, and the long edges of their faces, run-out curves included. */
export function flatsEdges({ body, map, merge }: Edges): Mark[] {
  return flatsOf(body).flatMap((cut) => [...faceEnds(cut, body, map), ...longEdges(cut, body, map, merge)]);
}

function faceEnds(cut: FlatsCut, body: Body, map: XMap): Mark[] {
  const marks: Mark[] = [];
  for (const [x, inner] of [
    [cut.from, 'right'],
    [cut.to, 'left'],
  ] as const) {
    if (x <= body.x0 + SAME || x >= body.x1 - SAME) continue;
    const r = radiusAt(body.outer, x, inner);
    const outside = radiusAt(body.outer, x, inner === 'right' ? 'left' : 'right');
    // A step of the profile draws its own edge; a run-out has no wall.
    if (Math.abs(r - outside) > SAME || r <= cut.distance + SAME) continue;
    const w = faceHalfWidth(cut, r);
    for (const angle of faceAngles(cut)) {
      if (Math.sin(angle) <= 1e-6) continue;
      const middle = -cut.distance * Math.cos(angle) * map.scale;
      const half = w * Math.sin(angle) * map.scale;
      const px = toPaper(map.knots, x);
      marks.push(lineMark('visible', px, middle - half, px, middle + half));
    }
  }
  return marks;
}

/** Stations along a cut where its edges are read: every change of profile, and between them where they bend. */
function readingStations(cut: FlatsCut, body: Body): number[] {
  const stations: number[] = [];
  for (const piece of body.outer) {
    const from = Math.max(piece.from, cut.from, body.x0);
    const to = Math.min(piece.to, cut.to, body.x1);
    // Where the metal lies within the flats there is no face and no edge.
    if (to - from <= SAME || Math.max(radiusAt([piece], from), radiusAt([piece], to)) <= cut.distance + SAME)
      continue;
    const steps = piece.kind === 'line' && piece.start === piece.end ? 1 : 20;
    for (let i = 0; i <= steps; i++) {
      // Closer together towards both ends: a run-out turns most where it ends, whichever way the work lies.
      const t = (1 - Math.cos((Math.PI * i) / steps)) / 2;
      stations.push(from + (to - from) * t);
    }
  }
  return stations;
}

function longEdges(cut: FlatsCut, body: Body, map: XMap, merge: number): Mark[] {
  const stations = readingStations(cut, body);
  const marks: Mark[] = [];
  const angles = faceAngles(cut);
  // What lies under the edges is read once a station, not once a face.
  const radii = stations.map((x) =>
    x >= cut.to - SAME ? radiusAt(body.outer, x, 'left') : radiusAt(body.outer, x, 'right'),
  );
  const halves = stations.map((x, i) =>
    faceHalfWidth(
      cut,
      x >= cut.to - SAME || x <= cut.from + SAME
        ? (radii[i] ?? 0)
        : Math.max(radii[i] ?? 0, radiusAt(body.outer, x, 'left')),
    ),
  );
  const places = stations.map((x) => toPaper(map.knots, x));
  const edge = (angle: number, side: 1 | -1): Point[] =>
    places.map((x, i) => {
      const y = cut.distance * Math.cos(angle) - side * (halves[i] ?? 0) * Math.sin(angle);
      return { x, y: -y * map.scale };
    });
  const reaches = radii.map((r) => reach(r, [cut]));
  const outlineAt = (upper: boolean): Point[] =>
    places.map((x, i) => ({
      x,
      y: (upper ? -(reaches[i]?.top ?? 0) : (reaches[i]?.bottom ?? 0)) * map.scale,
    }));
  const draw = (points: readonly Point[]): void => {
    const straight = straightened(points);
    if (straight.length > 1) marks.push({ type: 'polyline', line: 'visible', points: straight });
  };
  angles.forEach((angle, k) => {
    const next = angles[(k + 1) % angles.length];
    if (next === undefined) return;
    const corner = angle + Math.PI / cut.count;
    if (cut.count >= 3) {
      const one = edge(angle, 1);
      const two = edge(next, -1);
      if (Math.abs(Math.cos(corner)) > 0.985) {
        // A corner of the outline: only the face turned to the viewer shows its edge, once it leaves the outline.
        const seen = Math.sin(angle) > 1e-6 ? one : Math.sin(next) > 1e-6 ? two : null;
        if (seen) drawLeaving(seen, outlineAt(Math.cos(corner) > 0), merge, draw);
      } else if (Math.sin(corner) >= 0.02) drawCorner(one, two, merge, draw);
    } else if (Math.sin(angle) > 1e-6) {
      draw(edge(angle, 1));
      draw(edge(angle, -1));
    }
  });
  return marks.filter((mark) => !hugsOutline(mark, body, map, merge));
}

/** Two curves that part for good are drawn from where they leave one another; two that never do are one line. */
function partingWidth(one: readonly Point[], two: readonly Point[], merge: number): number {
  const apart = one.map((p, i) => Math.abs(p.y - (two[i]?.y ?? p.y)));
  const widest = Math.max(...apart);
  const closest = Math.min(...apart.slice(0, -1));
  // The strip of a rounded corner stays one line until its edges really part.
  return widest >= merge ? Math.min(merge, Math.max(PARTING, closest + PARTING / 2)) : merge;
}

/** The line as far as x, its end worked out between two points; at least its first point. */
function upTo(line: readonly Point[], x: number): Point[] {
  const kept = line.filter((p) => p.x <= x);
  const last = kept[kept.length - 1];
  const next = line[kept.length];
  if (!last) return line.slice(0, 1);
  if (!next || next.x <= last.x) return kept;
  const t = (x - last.x) / (next.x - last.x);
  return [...kept, { x, y: last.y + t * (next.y - last.y) }];
}

/** One line where the two edges of a rounded corner would print as a blot, two from where they part. */
function drawCorner(
  one: readonly Point[],
  two: readonly Point[],
  least: number,
  draw: (p: readonly Point[]) => void,
): void {
  const merge = partingWidth(one, two, least);
  let joint: Point[] = [];
  let a: Point[] = [];
  let b: Point[] = [];
  const flush = (): void => {
    draw(joint);
    draw(a);
    draw(b);
  };
  one.forEach((p, i) => {
    const q = two[i];
    if (!q) return;
    const middle = { x: p.x, y: (p.y + q.y) / 2 };
    if (Math.abs(p.y - q.y) < merge) {
      if (a.length > 0) {
        draw([...a, middle]);
        draw([...b, middle]);
        a = [];
        b = [];
        joint = [];
      }
      joint.push(middle);
    } else {
      if (joint.length > 0) {
        const eased = upTo(joint, p.x - (EASE * Math.abs(p.y - q.y)) / 2);
        const last = eased[eased.length - 1];
        if (last) {
          a.push(last);
          b.push(last);
        }
        draw(eased);
        joint = [];
      }
      a.push(p);
      b.push(q);
    }
  });
  flush();
}

/** The parts of an edge that stand clear of the outline, each begun and ended on it. */
function drawLeaving(
  edge: readonly Point[],
  outline: readonly Point[],
  least: number,
  draw: (p: readonly Point[]) => void,
): void {
  const merge = partingWidth(edge, outline, least);
  let run: Point[] = [];
  edge.forEach((p, i) => {
    const o = outline[i];
    if (!o) return;
    if (Math.abs(p.y - o.y) >= merge) {
      if (run.length === 0 && i > 0) {
        const from = upTo(outline.slice(0, i), p.x - EASE * Math.abs(p.y - o.y));
        run.push(from[from.length - 1] ?? o);
      }
      run.push(p);
    } else if (run.length > 0) {
      draw([...run, o]);
      run = [];
    }
  });
  draw(run);
}

function straightened(points: readonly Point[]): Point[] {
  const out: Point[] = [];
  for (const p of points) {
    const last = out[out.length - 1];
    const before = out[out.length - 2];
    if (last && Math.hypot(p.x - last.x, p.y - last.y) < 1e-4) continue;
    if (
      last &&
      before &&
      Math.abs((last.x - before.x) * (p.y - before.y) - (last.y - before.y) * (p.x - before.x)) < 1e-4
    )
      out.pop();
    out.push(p);
  }
  return out;
}

function hugsOutline(mark: Mark, body: Body, map: XMap, merge: number): boolean {
  if (mark.type !== 'polyline') return false;
  const highest = Math.max(
    ...body.outer.map((p) => (p.kind === 'line' ? Math.max(p.start, p.end) : p.radius)),
  );
  return mark.points.every((p) => Math.abs(p.y) > highest * map.scale - merge);
}

/** Thin root lines and, inside the part, the line that ends the full thread (ISO 6410-1). */
export function threadMarks({ body, map, merge }: Edges): Mark[] {
  return body.treatments
    .filter((t): t is ThreadTreatment => t.kind === 'thread' && !t.internal)
    .flatMap((thread) => threadLines(thread, body, map, merge));
}

function threadLines(thread: ThreadTreatment, body: Body, map: XMap, merge: number): Mark[] {
  const crest = thread.major / 2;
  const root = Math.min(thread.root / 2, crest - merge / map.scale);
  const marks: Mark[] = [];
  if (root > 0) {
    const from = firstAbove(body, thread.from, thread.to, root);
    const to = firstAbove(body, thread.to, thread.from, root);
    const [a, b] = [toPaper(map.knots, from), toPaper(map.knots, to)];
    marks.push(
      lineMark('thin', a, -root * map.scale, b, -root * map.scale),
      lineMark('thin', a, root * map.scale, b, root * map.scale),
    );
  }
  for (const x of [thread.from, thread.to]) {
    if (x <= body.x0 + SAME || x >= body.x1 - SAME) continue;
    const left = radiusAt(body.outer, x, 'left');
    const right = radiusAt(body.outer, x, 'right');
    if (Math.abs(left - right) > SAME) continue;
    const px = toPaper(map.knots, x);
    marks.push(lineMark('visible', px, -left * map.scale, px, left * map.scale));
  }
  return marks;
}

/** The station nearest `from` on the way to `to` where the metal reaches the radius (inside a chamfer it does not). */
function firstAbove(body: Body, from: number, to: number, radius: number): number {
  const way = Math.sign(to - from);
  const at = (x: number): number => radiusAt(body.outer, x, way > 0 ? 'right' : 'left');
  if (at(from) >= radius) return from;
  let low = 0;
  let high = 1;
  for (let i = 1; i <= 64; i++)
    if (at(from + ((to - from) * i) / 64) >= radius) {
      high = i / 64;
      low = (i - 1) / 64;
      break;
    }
  for (let i = 0; i < 30; i++) {
    const middle = (low + high) / 2;
    if (at(from + (to - from) * middle) >= radius) high = middle;
    else low = middle;
  }
  return from + (to - from) * high;
}

/** A thin line where two lengths of one diameter meet, so that each length can be read (they are one face of metal). */
export function faceDivisions(part: Part, { map }: Pick<Edges, 'map'>): Mark[] {
  return part.features.flatMap((left) => {
    if (left.kind !== 'cylinder') return [];
    const right = part.features.find(
      (f) =>
        f.kind === 'cylinder' &&
        Math.abs(f.from - left.to) < SAME &&
        Math.abs(f.diameter - left.diameter) < SAME,
    );
    if (!right) return [];
    const x = toPaper(map.knots, left.to);
    const r = (left.diameter / 2) * map.scale;
    return [lineMark('thin', x, -r, x, r)];
  });
}
