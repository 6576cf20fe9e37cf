/**
 * Where sizes end at one station their extension lines lie on one another: the longest is drawn, the others keep only what
 * reaches past it. Afterwards no extension line is drawn twice.
 */
import type { LineMark, Mark } from '../sheet';

const SAME = 0.05;
const LEAST_PIECE = 0.4;

/** An upright or level line as its place across and its reach along. */
interface Lie {
  upright: boolean;
  at: number;
  lo: number;
  hi: number;
}

function lieOf(mark: Mark): Lie | null {
  if (mark.type !== 'line' || mark.line !== 'extension') return null;
  if (mark.x1 === mark.x2)
    return { upright: true, at: mark.x1, lo: Math.min(mark.y1, mark.y2), hi: Math.max(mark.y1, mark.y2) };
  if (mark.y1 === mark.y2)
    return { upright: false, at: mark.y1, lo: Math.min(mark.x1, mark.x2), hi: Math.max(mark.x1, mark.x2) };
  return null;
}

function lineAt({ upright, at }: Lie, lo: number, hi: number): LineMark {
  return upright
    ? { type: 'line', line: 'extension', x1: at, y1: lo, x2: at, y2: hi }
    : { type: 'line', line: 'extension', x1: lo, y1: at, x2: hi, y2: at };
}

/** The sizes' marks with each stretch of an extension line drawn once. */
export function shareExtensions(sizes: readonly (readonly Mark[])[]): Mark[][] {
  const lines = sizes.flatMap((marks, i) =>
    marks.flatMap((mark, k) => {
      const lie = lieOf(mark);
      return lie ? [{ i, k, lie }] : [];
    }),
  );
  const order = [...lines].sort(
    (a, b) => b.lie.hi - b.lie.lo - (a.lie.hi - a.lie.lo) || a.i - b.i || a.k - b.k,
  );
  const drawn: Lie[] = [];
  const pieces = new Map<string, LineMark[]>();
  for (const { i, k, lie } of order) {
    let kept: (readonly [number, number])[] = [[lie.lo, lie.hi]];
    for (const other of drawn) {
      if (other.upright !== lie.upright || Math.abs(other.at - lie.at) >= SAME) continue;
      kept = kept.flatMap(([lo, hi]) => [
        ...(other.lo > lo ? [[lo, Math.min(hi, other.lo)] as const] : []),
        ...(other.hi < hi ? [[Math.max(lo, other.hi), hi] as const] : []),
      ]);
    }
    const left = kept.filter(([lo, hi]) => hi - lo >= LEAST_PIECE);
    const whole = left.length === 1 && left[0]?.[0] === lie.lo && left[0][1] === lie.hi;
    if (!whole)
      pieces.set(
        `${i} ${k}`,
        left.map(([lo, hi]) => lineAt(lie, lo, hi)),
      );
    for (const [lo, hi] of left) drawn.push({ ...lie, lo, hi });
  }
  return sizes.map((marks, i) => marks.flatMap((mark, k) => pieces.get(`${i} ${k}`) ?? [mark]));
}
