import type { Part } from '../../part/part';
import type { Scheme, Size } from '../../scheme/scheme';
import { boxAround } from '../geometry/box';
import type { Box } from '../geometry/box';
import type { CheckFinding, Group, LineType, Point, Sheet, ViewMap } from '../sheet';
import { strokesOf } from '../strokes';
import type { Stroke } from '../strokes';
import { textBox } from '../text-metrics';

/** A stroke with its box. */
export interface ReadStroke extends Stroke {
  box: Box;
}
/** A text or a symbol with its box. */
export interface ReadText {
  box: Box;
  text: string;
  symbol: boolean;
}
/** A group of the sheet as the check reads it. */
export interface ReadGroup {
  group: Group;
  index: number;
  /** How a finding names it. */
  name: string;
  strokes: readonly ReadStroke[];
  texts: readonly ReadText[];
  arrows: readonly Point[];
  /** Round all its strokes; null without any. */
  inked: Box | null;
}

/** Everything a rule may read: the finished sheet, and scheme and part for truth. */
export interface Reading {
  sheet: Sheet;
  scheme: Scheme;
  part: Part;
  groups: readonly ReadGroup[];
}

/** One rule of the sheet check. */
export interface CheckRule {
  id: string;
  check: (reading: Reading) => CheckFinding[];
}

function nameOf(group: Group): string {
  return group.sizeId ?? group.view ?? group.role;
}

function readGroup(group: Group, index: number): ReadGroup {
  const texts: ReadText[] = [];
  const arrows: Point[] = [];
  for (const mark of group.marks) {
    if (mark.type === 'text' && !mark.faint)
      texts.push({ box: textBox(mark), text: mark.text, symbol: false });
    else if (mark.type === 'symbol') texts.push({ box: mark.box, text: mark.name, symbol: true });
    else if (mark.type === 'polyline' && mark.line === 'arrow' && mark.points[0]) arrows.push(mark.points[0]);
  }
  const strokes = strokesOf(group.marks).map((s): ReadStroke => ({
    line: s.line,
    x1: s.x1,
    y1: s.y1,
    x2: s.x2,
    y2: s.y2,
    box: [Math.min(s.x1, s.x2), Math.min(s.y1, s.y2), Math.max(s.x1, s.x2), Math.max(s.y1, s.y2)],
  }));
  return {
    group,
    index,
    name: nameOf(group),
    strokes,
    texts,
    arrows,
    inked: boxAround(strokes.map((s) => s.box)),
  };
}

/** Reads a finished sheet. */
export function readSheet(sheet: Sheet, scheme: Scheme, part: Part): Reading {
  return { sheet, scheme, part, groups: sheet.groups.map(readGroup) };
}

/** A finding of the rule. */
export function finding(rule: string, message: string, entities: readonly string[]): CheckFinding {
  return { rule, message, entities };
}

export function ofRole(reading: Reading, role: Group['role']): ReadGroup[] {
  return reading.groups.filter((g) => g.group.role === role);
}

export function strokesOfKind(group: ReadGroup, line: LineType): ReadStroke[] {
  return group.strokes.filter((s) => s.line === line);
}

export function mapOf(reading: Reading, view: string | undefined): ViewMap | undefined {
  return reading.sheet.maps.find((m) => m.view === view);
}

export function sizeOf(reading: Reading, id: string | undefined): Size | undefined {
  return reading.scheme.sizes.find((s) => s.id === id);
}

/** Every pair of dimension groups, each pair once. */
export function dimensionPairs(reading: Reading): (readonly [ReadGroup, ReadGroup])[] {
  const groups = ofRole(reading, 'dimension');
  return groups.flatMap((a, i) => groups.slice(i + 1).map((b) => [a, b] as const));
}
