import { describe, expect, it } from 'vitest';
import { adviseSheet, adviceRules } from '../../../shared/drawing/check/advise-sheet';
import type { Group, LineMark, Mark, Sheet } from '../../../shared/drawing/sheet';
import { namedParts } from '../../corpus/named-parts';
import { sheetOf } from '../../corpus/sheet-of';

/** Why a named part may be advised on: a groove between two collars is reached by no leader that crosses neither. */
const ALLOWED: Readonly<Record<string, readonly string[]>> = { 'narrow-collars': ['leader-over-outline'] };

const named = (name: string) => {
  const found = namedParts.find((p) => p.name === name);
  if (!found) throw new Error(`The corpus has lost ${name}.`);
  return found;
};
const handle = named('windlass-handle');
const good = sheetOf(handle.template, handle.typed, { ...handle, options: { balloons: false } });
const axis = good.sheet.maps.find((m) => m.view === 'axis');
if (!axis) throw new Error('The handle has no axis view.');
const grip = (axis.knots[0]?.[1] ?? 0) + 40;
const top = axis.axisY - 12.5;

const add =
  (test: (g: Group) => boolean, ...marks: Mark[]) =>
  (sheet: Sheet): Sheet => ({
    ...sheet,
    groups: sheet.groups.map((g) => (test(g) ? { ...g, marks: [...g.marks, ...marks] } : g)),
  });
const size =
  (id: string) =>
  (g: Group): boolean =>
    g.role === 'dimension' && g.sizeId === id;
const line = (kind: LineMark['line'], x1: number, y1: number, x2: number, y2: number): LineMark => ({
  type: 'line',
  line: kind,
  x1,
  y1,
  x2,
  y2,
});
const leader = (x1: number, y1: number, x2: number, y2: number): Mark => ({
  type: 'polyline',
  line: 'leader',
  points: [
    { x: x1, y: y1 },
    { x: x2, y: y2 },
  ],
});

const spoilt: Readonly<Record<string, (sheet: Sheet) => Sheet>> = {
  'leader-length': add(size('overall'), leader(250, 20, 230, 62)),
  'leader-over-outline': add(size('overall'), leader(grip + 10, top + 2, grip + 6, top - 4)),
  'extension-hugs': add(size('overall'), line('extension', grip, top - 0.8, grip + 8, top - 0.8)),
  'outlines-merge': add((g) => g.view === 'axis', line('visible', grip, top - 0.3, grip + 8, top - 0.3)),
  'leaders-lean': (sheet) =>
    add(size('taperLength'), leader(258, 30, 255, 24))(add(size('overall'), leader(250, 30, 253, 24))(sheet)),
};

describe('advice', () => {
  it.each(namedParts.map((part) => [part.name, part] as const))('has nothing to say of %s', (name, part) => {
    const { sheet, scheme, part: made } = sheetOf(part.template, part.typed, part);
    const said = adviseSheet(sheet, scheme, made).map((a) => a.rule);
    expect(said).toEqual(ALLOWED[name] ?? []);
  });

  it.each(Object.entries(spoilt))('sees %s', (rule, spoil) => {
    const found = adviseSheet(spoil(good.sheet), good.scheme, good.part);
    expect(found.map((a) => a.rule)).toEqual([rule]);
  });

  it('sees a drawing too small for its sheet, and a step too short to be seen', () => {
    const small = sheetOf(handle.template, handle.typed, {
      ...handle,
      options: { sheet: 'A2', scale: 0.2, balloons: false },
    });
    const said = adviseSheet(small.sheet, small.scheme, small.part).map((a) => a.rule);
    expect(said).toEqual(expect.arrayContaining(['small-on-sheet', 'small-detail']));
  });

  it('sees an interruption in a length that is not slender', () => {
    const rod = named('long-slender-rod');
    const { sheet, scheme, part } = sheetOf(rod.template, rod.typed, rod);
    const stubby = {
      ...part,
      features: part.features.map((f) => (f.kind === 'cylinder' ? { ...f, diameter: 400 } : f)),
    };
    expect(adviseSheet(sheet, scheme, stubby).map((a) => a.rule)).toContain('break-in-stubby');
  });

  it('has a bad sheet for every rule', () => {
    expect([...Object.keys(spoilt), 'small-on-sheet', 'small-detail', 'break-in-stubby'].sort()).toEqual(
      adviceRules.map((r) => r.id).sort(),
    );
  });
});
