import type { Box } from './geometry/box';
import type { Segment } from './geometry/segment';
import type { CircleMark, LineMark, LineType, Mark, PathMark, PolylineMark } from './sheet';
import { textBox } from './text-metrics';

/** A straight piece of ink with the kind of line it belongs to. */
export interface Stroke extends Segment {
  line: LineType;
}

/** Degrees an arc is flattened by: used to test for collisions only, never to draw. */
const FLATTEN = Math.PI / 15;

function arcPoints(x1: number, y1: number, r: number, large: 0 | 1, sweep: 0 | 1, x2: number, y2: number) {
  const dx = (x2 - x1) / 2;
  const dy = (y2 - y1) / 2;
  const half = Math.hypot(dx, dy);
  if (half < 1e-9) return [{ x: x2, y: y2 }];
  const radius = Math.max(r, half);
  const rise = Math.sqrt(Math.max(0, radius * radius - half * half));
  const side = large === sweep ? -1 : 1;
  const cx = (x1 + x2) / 2 + (side * rise * -dy) / half;
  const cy = (y1 + y2) / 2 + (side * rise * dx) / half;
  const start = Math.atan2(y1 - cy, x1 - cx);
  let turn = Math.atan2(y2 - cy, x2 - cx) - start;
  if (sweep === 1 && turn < 0) turn += 2 * Math.PI;
  if (sweep === 0 && turn > 0) turn -= 2 * Math.PI;
  const steps = Math.max(1, Math.ceil(Math.abs(turn) / FLATTEN));
  return Array.from({ length: steps }, (_, i) => {
    const angle = start + (turn * (i + 1)) / steps;
    return i === steps - 1
      ? { x: x2, y: y2 }
      : { x: cx + radius * Math.cos(angle), y: cy + radius * Math.sin(angle) };
  });
}

function pathStrokes(mark: PathMark, out: Stroke[]): void {
  let x = 0;
  let y = 0;
  let sx = 0;
  let sy = 0;
  const to = (nx: number, ny: number): void => {
    out.push({ line: mark.line, x1: x, y1: y, x2: nx, y2: ny });
    x = nx;
    y = ny;
  };
  for (const c of mark.commands) {
    if (c.op === 'M') {
      x = sx = c.x;
      y = sy = c.y;
    } else if (c.op === 'L') to(c.x, c.y);
    else if (c.op === 'A') for (const p of arcPoints(x, y, c.r, c.large, c.sweep, c.x, c.y)) to(p.x, p.y);
    else if (c.op === 'Z') to(sx, sy);
    else if (c.op === 'C') {
      const { x: x0, y: y0 } = { x, y };
      for (let i = 1; i <= 8; i++) {
        const t = i / 8;
        const m = 1 - t;
        const at = (a: number, b: number, d: number, e: number): number =>
          m * m * m * a + 3 * m * m * t * b + 3 * m * t * t * d + t * t * t * e;
        to(at(x0, c.x1, c.x2, c.x), at(y0, c.y1, c.y2, c.y));
      }
    }
  }
}

function pushStrokes(mark: LineMark | PolylineMark | PathMark | CircleMark, out: Stroke[]): void {
  if (mark.type === 'line') out.push({ line: mark.line, x1: mark.x1, y1: mark.y1, x2: mark.x2, y2: mark.y2 });
  else if (mark.type === 'polyline') {
    const n = mark.points.length;
    const last = mark.closed ? n : n - 1;
    for (let i = 0; i < last; i++) {
      const a = mark.points[i];
      const b = mark.points[(i + 1) % n];
      if (a && b) out.push({ line: mark.line, x1: a.x, y1: a.y, x2: b.x, y2: b.y });
    }
  } else if (mark.type === 'path') pathStrokes(mark, out);
  else {
    const steps = Math.ceil((2 * Math.PI) / FLATTEN);
    for (let i = 0; i < steps; i++) {
      const a = (2 * Math.PI * i) / steps;
      const b = (2 * Math.PI * (i + 1)) / steps;
      out.push({
        line: mark.line,
        x1: mark.cx + mark.r * Math.cos(a),
        y1: mark.cy + mark.r * Math.sin(a),
        x2: mark.cx + mark.r * Math.cos(b),
        y2: mark.cy + mark.r * Math.sin(b),
      });
    }
  }
}

/** Every stroke of the marks as straight pieces; texts and symbols have none. */
export function strokesOf(marks: readonly Mark[]): Stroke[] {
  const out: Stroke[] = [];
  for (const mark of marks) if (mark.type !== 'text' && mark.type !== 'symbol') pushStrokes(mark, out);
  return out;
}

/** Boxes of texts and symbols, faint texts left out. */
export function textBoxesOf(marks: readonly Mark[]): Box[] {
  const out: Box[] = [];
  for (const mark of marks) {
    if (mark.type === 'text' && !mark.faint) out.push(textBox(mark));
    else if (mark.type === 'symbol') out.push(mark.box);
  }
  return out;
}

/** The box of a stroke. */
export function strokeBox(s: Segment): Box {
  return [Math.min(s.x1, s.x2), Math.min(s.y1, s.y2), Math.max(s.x1, s.x2), Math.max(s.y1, s.y2)];
}
