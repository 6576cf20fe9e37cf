import type { Size } from '../scheme/scheme';
import type { Footprint } from './footprint';
import type { Label } from './label';
import type { RuleFigures } from './rules';
import type { Writing } from './size-text';
import type { DraftingStyle, Mark, Point } from './sheet';
import type { XMap } from './x-map';

/** A size with its writing, before it has a place. */
export interface ReadySize {
  size: Size;
  label: Label;
}

/** One complete way of drawing a size: everything it needs, at what price. */
export interface Candidate {
  form: 'inside' | 'end' | 'through' | 'leader' | 'lane' | 'view';
  marks: () => readonly Mark[];
  print: Footprint;
  /** Own price, meetings with the view and the lengths included. */
  cost: number;
  /** Refused meetings with what is fixed. */
  clashes: number;
  /** Box of the writing, where a balloon may stand beside it. */
  textBox: readonly [number, number, number, number];
  rotate?: -90;
}

export interface PlacedSize {
  ready: ReadySize;
  candidate: Candidate;
  forView: string;
}

/** The axis view on floating paper: axis at y = 0, its left end at x = 0. */
export interface AxisPaper {
  style: DraftingStyle;
  rules: RuleFigures;
  writing: Writing;
  map: XMap;
  /** Everything drawn of the view. */
  marks: readonly Mark[];
  print: Footprint;
  /** Upper and lower edge of the silhouette, left to right (y up negative, as on paper). */
  top: readonly Point[];
  bottom: readonly Point[];
  /** Largest reach from the axis on paper. */
  reach: number;
  left: number;
  right: number;
}

/** Highest reach of a silhouette edge over [x0, x1] of paper, as a positive distance; 0 where there is none. */
export function reachWithin(edge: readonly Point[], x0: number, x1: number): number {
  let most = 0;
  for (let i = 0; i + 1 < edge.length; i++) {
    const a = edge[i];
    const b = edge[i + 1];
    if (!a || !b || b.x < x0 || a.x > x1) continue;
    for (const x of [Math.max(a.x, x0), Math.min(b.x, x1)]) {
      const t = b.x > a.x ? (x - a.x) / (b.x - a.x) : 0;
      most = Math.max(most, Math.abs(a.y + t * (b.y - a.y)));
    }
    if (b.x === a.x) most = Math.max(most, Math.abs(a.y), Math.abs(b.y));
  }
  return most;
}
