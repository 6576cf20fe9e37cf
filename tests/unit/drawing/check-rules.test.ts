import { describe, expect, it } from 'vitest';
import { checkRules, checkSheet } from '../../../shared/drawing/check/check-sheet';
import { moveMarks } from '../../../shared/drawing/move';
import type { Group, LineMark, Mark, Sheet } from '../../../shared/drawing/sheet';
import type { Scheme } from '../../../shared/scheme/scheme';
import { TAPERED_HANDLE_EXAMPLES } from '../../../templates/tapered-handle-examples';
import { namedParts } from '../../corpus/named-parts';
import { sheetOf } from '../../corpus/sheet-of';

const handle = sheetOf('tapered-handle', TAPERED_HANDLE_EXAMPLES[0].values, {
  style: 'iso',
  unit: 'mm',
  options: { balloons: false },
});
const numbered = sheetOf('tapered-handle', TAPERED_HANDLE_EXAMPLES[0].values, { style: 'iso', unit: 'mm' });
const third = sheetOf('tapered-handle', TAPERED_HANDLE_EXAMPLES[0].values, {
  style: 'asme',
  unit: 'mm',
  options: { balloons: false },
});
const rod = namedParts.find((p) => p.name === 'long-slender-rod');
if (!rod) throw new Error('The corpus has lost its rod.');
const interrupted = sheetOf(rod.template, rod.typed, { ...rod, options: { balloons: false } });

type Spoil = (sheet: Sheet) => Sheet;
const change =
  (test: (g: Group) => boolean, act: (g: Group) => Group): Spoil =>
  (sheet) => ({
    ...sheet,
    groups: sheet.groups.map((g) => (test(g) ? act(g) : g)),
  });
const size =
  (id: string) =>
  (g: Group): boolean =>
    g.role === 'dimension' && g.sizeId === id;
const view =
  (name: string) =>
  (g: Group): boolean =>
    g.role === 'view' && g.view === name;
const add =
  (...marks: Mark[]) =>
  (g: Group): Group => ({ ...g, marks: [...g.marks, ...marks] });
const line = (kind: LineMark['line'], x1: number, y1: number, x2: number, y2: number): LineMark => ({
  type: 'line',
  line: kind,
  x1,
  y1,
  x2,
  y2,
});
const inNotes = (...marks: Mark[]): Spoil => change((g) => g.role === 'notes', add(...marks));
/** A clear spot of the drawing space on every sheet used here. */
const FREE = { x: 240, y: 20 };

interface Case {
  rule: string;
  from?: typeof handle;
  spoil: Spoil;
  scheme?: (scheme: Scheme) => Scheme;
}

const lengthLine = (sheet: Sheet): LineMark => {
  const group = sheet.groups.find(size('taperLength'));
  const found = group?.marks.find((m): m is LineMark => m.type === 'line' && m.line === 'dimension');
  if (!found) throw new Error('The taper has no dimension line.');
  return found;
};
const base = lengthLine(handle.sheet);
const axis = handle.sheet.maps.find((m) => m.view === 'axis');
const end = handle.sheet.maps.find((m) => m.view.startsWith('end'));
if (!axis || !end || end.centreX === undefined) throw new Error('The handle has lost a view.');
const endX = end.centreX;
const axisEnd = axis.knots[axis.knots.length - 1]?.[1] ?? 0;

const cases: readonly Case[] = [
  { rule: 'text-size', spoil: inNotes({ type: 'text', ...FREE, size: 3, anchor: 'start', text: 'small' }) },
  {
    rule: 'text-text',
    spoil: inNotes(
      ...[0, 2].map((dx): Mark => ({
        type: 'text',
        x: FREE.x + dx,
        y: FREE.y,
        size: 4,
        anchor: 'start',
        text: 'over',
      })),
    ),
  },
  {
    rule: 'text-stroke',
    spoil: inNotes(
      { type: 'text', ...FREE, size: 4, anchor: 'start', text: 'struck' },
      line('thin', FREE.x - 2, FREE.y - 1, FREE.x + 20, FREE.y - 1),
    ),
  },
  {
    rule: 'text-direction',
    from: third,
    spoil: inNotes({ type: 'text', x: 200, y: 45, size: 4, anchor: 'start', rotate: -90, text: 'turned' }),
  },
  {
    rule: 'dimension-crossing',
    spoil: (s) =>
      change(
        size('gripLength'),
        add(line('dimension', base.x1 + 30, base.y1 - 3, base.x1 + 31, base.y1 + 3)),
      )(s),
  },
  {
    rule: 'dimension-overlap',
    spoil: (s) =>
      change(size('gripLength'), add(line('dimension', base.x1 + 4, base.y1, base.x1 + 9, base.y1)))(s),
  },
  {
    rule: 'foreign-outline',
    spoil: change(
      size('gripLength'),
      add(line('dimension', endX + 3, end.axisY - 14, endX + 8, end.axisY - 4)),
    ),
  },
  {
    rule: 'spacing',
    spoil: (s) =>
      change(
        size('gripLength'),
        add(line('dimension', base.x1 + 4, base.y1 - 5, base.x1 + 14, base.y1 - 5)),
      )(s),
  },
  {
    rule: 'extension-edge',
    spoil: change(size('gripLength'), add(line('extension', FREE.x, FREE.y, FREE.x, FREE.y + 4))),
  },
  {
    rule: 'extension-twice',
    spoil: change(size('gripLength'), add(line('extension', base.x2, base.y2 - 4, base.x2, base.y2 + 1))),
  },
  {
    rule: 'leader-angle',
    spoil: change(
      size('threadChamfer'),
      add({
        type: 'polyline',
        line: 'leader',
        points: [
          { x: FREE.x, y: FREE.y },
          { x: FREE.x + 10, y: FREE.y - 2 },
        ],
      }),
    ),
  },
  {
    rule: 'leaders-cross',
    spoil: (s) =>
      change(
        size('endCrown'),
        add({
          type: 'polyline',
          line: 'leader',
          points: [
            { x: FREE.x, y: FREE.y },
            { x: FREE.x + 5, y: FREE.y - 5 },
          ],
        }),
      )(
        change(
          size('threadChamfer'),
          add({
            type: 'polyline',
            line: 'leader',
            points: [
              { x: FREE.x, y: FREE.y - 5 },
              { x: FREE.x + 5, y: FREE.y },
            ],
          }),
        )(s),
      ),
  },
  { rule: 'inside-frame', spoil: inNotes(line('thin', 5, 5, 5, 8)) },
  {
    rule: 'views-overlap',
    spoil: change(view(end.view), (g) => ({
      ...g,
      marks: [...g.marks, line('thin', axisEnd - 4, axis.axisY + 1, axisEnd - 3, axis.axisY + 1)],
    })),
  },
  { rule: 'scale-series', spoil: change(view(end.view), (g) => ({ ...g, scale: 0.7 })) },
  {
    rule: 'line-widths',
    spoil: change(size('gripLength'), add(line('visible', FREE.x, FREE.y, FREE.x, FREE.y + 4))),
  },
  {
    rule: 'centre-line',
    spoil: change(view('axis'), (g) => ({
      ...g,
      marks: g.marks.filter((m) => !(m.type === 'line' && m.line === 'centre')),
    })),
  },
  {
    rule: 'break-lines',
    from: interrupted,
    spoil: change(view('axis'), (g) => ({
      ...g,
      marks: g.marks.filter((m) => !(m.type === 'polyline' && m.line === 'break')),
    })),
  },
  { rule: 'size-missing', spoil: (s) => ({ ...s, groups: s.groups.filter((g) => !size('gripLength')(g)) }) },
  {
    rule: 'size-twice',
    spoil: (s) => s,
    scheme: (scheme) => ({ ...scheme, completeness: { ...scheme.completeness, redundant: ['overall'] } }),
  },
  {
    rule: 'geometry',
    spoil: change(size('endCrown'), (g) => ({
      ...g,
      marks: g.marks.map((m) =>
        m.type === 'polyline' && m.line === 'arrow' ? (moveMarks([m], 1, -0.4)[0] ?? m) : m,
      ),
    })),
  },
  {
    rule: 'figure',
    spoil: change(size('taperLength'), (g) => ({
      ...g,
      marks: g.marks.map((m) => (m.type === 'text' ? { ...m, text: m.text.replace('95', '59') } : m)),
    })),
  },
  {
    rule: 'stacked-limits',
    spoil: change(size('spigotDiameter'), (g) => ({
      ...g,
      marks: g.marks.map((m) => (m.type === 'text' && m.text === '0' ? { ...m, text: '+0.01' } : m)),
    })),
  },
  {
    rule: 'balloons',
    from: numbered,
    spoil: (s) => ({
      ...s,
      groups: s.groups.filter((g) => !(g.role === 'balloon' && g.sizeId === 'gripLength')),
    }),
  },
  { rule: 'numbers', spoil: change((g) => g.role === 'frame', add(line('thin', NaN, 0, 0, 0))) },
];

describe('the sheet check', () => {
  it.each([
    ['first angle', handle],
    ['with balloons', numbered],
    ['third angle', third],
    ['interrupted', interrupted],
  ])('finds nothing on a good sheet, %s', (_, { sheet, scheme, part }) => {
    expect(checkSheet(sheet, scheme, part)).toEqual([]);
  });

  it('has a bad sheet for every rule', () => {
    expect(cases.map((c) => c.rule).sort()).toEqual(checkRules.map((r) => r.id).sort());
  });

  it.each(cases.map((c) => [c.rule, c] as const))(
    '%s is found by its own rule and no other',
    (rule, { from = handle, spoil, scheme }) => {
      const judged = scheme ? scheme(from.scheme) : from.scheme;
      const found = checkSheet(spoil(from.sheet), judged, from.part);
      expect([...new Set(found.map((f) => f.rule))]).toEqual([rule]);
      expect(found.every((f) => f.message.endsWith('.') && f.entities.length > 0)).toBe(true);
    },
  );
});
