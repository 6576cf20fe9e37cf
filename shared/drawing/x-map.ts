/** Part x to paper x: straight between knots; one knot pair spans each interruption. */
export interface XMap {
  scale: number;
  knots: readonly (readonly [number, number])[];
  /** Spans of the part that are left out, in part x. */
  breaks: readonly (readonly [number, number])[];
}

/** The map of a part drawn from `from` to `to`, the spans in `breaks` (in order) drawn as a gap of `gap` mm. */
export function makeXMap(
  from: number,
  to: number,
  scale: number,
  breaks: readonly (readonly [number, number])[],
  gap: number,
): XMap {
  const knots: [number, number][] = [[from, 0]];
  let paper = 0;
  let last = from;
  for (const [a, b] of breaks) {
    paper += (a - last) * scale;
    knots.push([a, paper]);
    paper += gap;
    knots.push([b, paper]);
    last = b;
  }
  knots.push([to, paper + (to - last) * scale]);
  return { scale, knots, breaks };
}

function along(knots: readonly (readonly [number, number])[], value: number, from: 0 | 1): number {
  const to = from === 0 ? 1 : 0;
  let i = 0;
  while (i + 2 < knots.length && value > (knots[i + 1]?.[from] ?? Infinity)) i++;
  const a = knots[i];
  const b = knots[i + 1];
  if (!a || !b) throw new Error('A view map needs two knots');
  if (b[from] === a[from]) return a[to];
  return a[to] + ((value - a[from]) * (b[to] - a[to])) / (b[from] - a[from]);
}

/** Part x to paper x. */
export function toPaper(knots: XMap['knots'], x: number): number {
  return along(knots, x, 0);
}

/** Paper x to part x. */
export function toPart(knots: XMap['knots'], paper: number): number {
  return along(knots, paper, 1);
}
