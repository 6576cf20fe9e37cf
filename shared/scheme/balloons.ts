import type { SizeAnchor } from './scheme';

/** Station a size is met at when the sheet is read from left to right. */
export function readingStation(anchor: SizeAnchor): number {
  switch (anchor.kind) {
    case 'across':
      return anchor.at ?? anchor.from;
    case 'corner':
      return anchor.x;
    default:
      return anchor.from;
  }
}

/**
 * Balloon numbers in reading order: along x, and as the template writes them where several begin together.
 * Frozen numbers stay; a new size takes the next number never used; a reference size has 0.
 */
export function numberBalloons(
  sizes: readonly { id: string; reference: boolean; anchor: SizeAnchor }[],
  frozen: Readonly<Record<string, number>> = {},
): ReadonlyMap<string, number> {
  const numbers = new Map<string, number>();
  let next = Math.max(0, ...Object.values(frozen)) + 1;
  const inOrder = sizes
    .map((size, index) => ({ ...size, index, x: readingStation(size.anchor) }))
    .sort((a, b) => (Math.abs(a.x - b.x) > 1e-6 ? a.x - b.x : a.index - b.index));
  for (const { id, reference } of inOrder) {
    if (reference) numbers.set(id, 0);
    else {
      const kept = Object.hasOwn(frozen, id) ? frozen[id] : undefined;
      numbers.set(id, kept ?? next);
      if (kept === undefined) next += 1;
    }
  }
  return numbers;
}
