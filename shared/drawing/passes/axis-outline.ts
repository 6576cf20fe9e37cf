import type { ProfilePoint, ProfileSpan } from '../profile';
import type { Mark, PathCommand, Point } from '../sheet';
import type { XMap } from '../x-map';
import { toPaper } from '../x-map';
import { lineMark } from '../arrow';

interface Node extends Point {
  /** Arc from the node before to this one. */
  arc?: { r: number; sweep: 0 | 1 };
}

interface Side {
  top: Node[];
  bottom: Node[];
}

function addPoint(side: Side, map: XMap, p: ProfilePoint, arc?: { r: number; convex: boolean }): void {
  const x = toPaper(map.knots, p.x);
  const { scale } = map;
  const top: Node = { x, y: -p.top * scale };
  const bottom: Node = { x, y: p.bottom * scale };
  if (arc) {
    top.arc = { r: arc.r * scale, sweep: arc.convex ? 1 : 0 };
    bottom.arc = { r: arc.r * scale, sweep: arc.convex ? 0 : 1 };
  }
  pushNode(side.top, top);
  pushNode(side.bottom, bottom);
}

function pushNode(nodes: Node[], node: Node): void {
  const last = nodes[nodes.length - 1];
  if (last && Math.hypot(last.x - node.x, last.y - node.y) < 1e-6) return;
  const before = nodes[nodes.length - 2];
  // Three points of one straight line are one stroke: equal neighbouring diameters are one face.
  if (last && before && !node.arc && !last.arc) {
    const cross = (last.x - before.x) * (node.y - before.y) - (last.y - before.y) * (node.x - before.x);
    if (Math.abs(cross) < 1e-6) nodes.pop();
  }
  nodes.push(node);
}

/** A linear point of the silhouette between two points. */
function between(a: ProfilePoint, b: ProfilePoint, x: number): ProfilePoint {
  const t = (x - a.x) / (b.x - a.x);
  return { x, top: a.top + t * (b.top - a.top), bottom: a.bottom + t * (b.bottom - a.bottom) };
}

/** Nodes of each uninterrupted piece of the view, left to right. */
function sidesOf(profile: readonly ProfileSpan[], map: XMap): Side[] {
  const sides: Side[] = [{ top: [], bottom: [] }];
  for (const span of profile) {
    let side = sides[sides.length - 1];
    if (!side) continue;
    const [first, ...rest] = span.points;
    if (!first) continue;
    const gap = map.breaks.find(([a, b]) => span.from < a && b < span.to);
    addPoint(side, map, first);
    if (gap) {
      const last = rest[rest.length - 1] ?? first;
      addPoint(side, map, between(first, last, gap[0]));
      side = { top: [], bottom: [] };
      sides.push(side);
      addPoint(side, map, between(first, last, gap[1]));
    }
    for (const point of rest)
      addPoint(side, map, point, span.arc ? { r: span.arc.radius, convex: span.arc.sign > 0 } : undefined);
  }
  return sides;
}

function commands(nodes: readonly Node[], start: 'M' | 'L'): PathCommand[] {
  return nodes.map((node, i) => {
    if (i === 0) return { op: start, x: node.x, y: node.y };
    return node.arc
      ? { op: 'A', r: node.arc.r, large: 0, sweep: node.arc.sweep, x: node.x, y: node.y }
      : { op: 'L', x: node.x, y: node.y };
  });
}

/** The same run of nodes walked the other way. */
function reversed(nodes: readonly Node[]): Node[] {
  return nodes
    .map((node, i): Node => {
      const next = nodes[i + 1];
      return next?.arc
        ? { x: node.x, y: node.y, arc: { r: next.arc.r, sweep: next.arc.sweep ? 0 : 1 } }
        : { x: node.x, y: node.y };
    })
    .reverse();
}

/** The outline as it is drawn and the points of its upper and lower edge on paper (axis at 0), for layout. */
export interface AxisOutline {
  marks: Mark[];
  top: Point[];
  bottom: Point[];
}

/** The outline of the axis view: one closed path, or an open path a piece where the view is interrupted. */
export function axisOutline(profile: readonly ProfileSpan[], map: XMap): AxisOutline {
  const sides = sidesOf(profile, map);
  const marks: Mark[] = [];
  if (sides.length === 1 && sides[0]) {
    const { top, bottom } = sides[0];
    marks.push({
      type: 'path',
      line: 'visible',
      commands: [...commands(top, 'M'), ...commands(reversed(bottom), 'L'), { op: 'Z' }],
    });
  } else
    sides.forEach((side, i) => {
      if (i === 0)
        marks.push({
          type: 'path',
          line: 'visible',
          commands: [...commands(reversed(side.bottom), 'M'), ...commands(side.top, 'L')],
        });
      else if (i === sides.length - 1)
        marks.push({
          type: 'path',
          line: 'visible',
          commands: [...commands(side.top, 'M'), ...commands(reversed(side.bottom), 'L')],
        });
      else
        marks.push(
          { type: 'path', line: 'visible', commands: commands(side.top, 'M') },
          { type: 'path', line: 'visible', commands: commands(side.bottom, 'M') },
        );
    });
  return {
    marks,
    top: sides.flatMap((s) => sampled(s.top)),
    bottom: sides.flatMap((s) => sampled(s.bottom)),
  };
}

/** Arcs as a few points, so that heights between two nodes can be read. */
function sampled(nodes: readonly Node[]): Point[] {
  const out: Point[] = [];
  nodes.forEach((node, i) => {
    const before = nodes[i - 1];
    if (node.arc && before) {
      const { r, sweep } = node.arc;
      const mx = (before.x + node.x) / 2;
      const my = (before.y + node.y) / 2;
      const half = Math.hypot(node.x - before.x, node.y - before.y) / 2;
      const rise = Math.sqrt(Math.max(0, r * r - half * half));
      const nx = -(node.y - before.y) / (2 * half);
      const ny = (node.x - before.x) / (2 * half);
      const cx = mx + (sweep ? rise : -rise) * nx;
      const cy = my + (sweep ? rise : -rise) * ny;
      for (let k = 1; k < 8; k++) {
        const px = before.x + ((node.x - before.x) * k) / 8 - cx;
        const py = before.y + ((node.y - before.y) * k) / 8 - cy;
        const d = Math.hypot(px, py) || 1;
        out.push({ x: cx + (px / d) * r, y: cy + (py / d) * r });
      }
    }
    out.push({ x: node.x, y: node.y });
  });
  return out;
}

/** Long-break lines with a zigzag (ISO 128) on both sides of each interruption. */
export function breakLines(profile: readonly ProfileSpan[], map: XMap): Mark[] {
  return map.breaks.flatMap(([a, b]) => {
    const span = profile.find((s) => s.from < a && b < s.to);
    const first = span?.points[0];
    if (!span || !first) return [];
    return [a, b].map((x): Mark => {
      const px = toPaper(map.knots, x);
      const half = Math.max(first.top, first.bottom) * map.scale + 2.2;
      const zig = Math.min(1.6, half * 0.3);
      return {
        type: 'polyline',
        line: 'break',
        points: [
          { x: px, y: -half },
          { x: px, y: -zig },
          { x: px - 1, y: -zig / 3 },
          { x: px + 1, y: zig / 3 },
          { x: px, y: zig },
          { x: px, y: half },
        ],
      };
    });
  });
}

/** The centre line of the axis view, `past` mm over each end. */
export function axisCentreLine(map: XMap, past: number): Mark {
  const first = map.knots[0];
  const last = map.knots[map.knots.length - 1];
  if (!first || !last) throw new Error('A view map needs two knots');
  return lineMark('centre', first[1] - past, 0, last[1] + past, 0);
}
