import type { Bar } from './register';

export interface CutList {
  /** Pieces got from each bar, and what is left of it. */
  bars: { bar: string; pieces: number; left: number }[];
  pieces: number;
  short: number;
}

/** How many pieces of a length a bar gives: the saw's width goes with every piece but where the bar ends with it. */
export function piecesFrom(length: number, piece: number, kerf: number, hold = 0): number {
  const usable = length - hold;
  return usable < piece ? 0 : Math.floor((usable + kerf) / (piece + kerf) + 1e-9);
}

/** Lays N pieces over the rack's bars of one section, shortest bar that does it all first, else the longest. */
export function cutList(bars: readonly Bar[], piece: number, kerf: number, count: number, hold = 0): CutList {
  const single = bars.flatMap((bar) => Array.from({ length: Math.min(bar.quantity, count) }, () => bar));
  const byLength = [...single].sort((a, b) => a.length - b.length || (a.id < b.id ? -1 : 1));
  const list: CutList = { bars: [], pieces: 0, short: count };
  while (list.short > 0 && byLength.length > 0) {
    const enough = byLength.findIndex((bar) => piecesFrom(bar.length, piece, kerf, hold) >= list.short);
    const index = enough >= 0 ? enough : byLength.length - 1;
    const [bar] = byLength.splice(index, 1);
    if (!bar) break;
    const pieces = Math.min(list.short, piecesFrom(bar.length, piece, kerf, hold));
    if (pieces === 0) continue;
    list.bars.push({ bar: bar.id, pieces, left: Math.max(0, bar.length - pieces * (piece + kerf)) });
    list.pieces += pieces;
    list.short -= pieces;
  }
  return list;
}
