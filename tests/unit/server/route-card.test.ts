import { describe, expect, it } from 'vitest';
import { cellLines, fitColumns } from '../../../server/pdf/route-card/columns';
import type { Cells } from '../../../server/pdf/route-card/cells';
import { CHARACTERS, COLUMNS, PAGE } from '../../../server/pdf/route-card/measures';
import { routeCard } from '../../../server/pdf/route-card/route-card';
import { wrap } from '../../../server/pdf/route-card/wrap';
import type { Mark, Sheet, TextMark } from '../../../shared/drawing/sheet';
import { runEngine } from '../../../shared/engine-run';
import { exampleRegister } from '../../../shared/route/example-register';
import type { Operation, Route } from '../../../shared/route/route';
import { templates } from '../../../templates';
import { exampleRequest } from '../../gallery/example-request';

type Box = readonly [x0: number, y0: number, x1: number, y1: number];

const units = [
  ['mm', 'iso'],
  ['in', 'asme'],
] as const;
const cases = templates.flatMap((template) =>
  units.map(([unit, style]) => {
    const { good } = runEngine(exampleRequest(template, style, unit));
    if (!good?.route) throw new Error(`The worked example of ${template.id} has no route.`);
    const facts = {
      number: 'PN-0147',
      letter: 'B',
      title: template.name,
      state: 'RELEASED 2026-03-09',
      stamp: undefined,
      entryUnit: 'mm' as const,
      register: exampleRegister,
    };
    return {
      name: `${template.id} in ${unit}`,
      route: good.route,
      pages: routeCard(good.route, good.scheme, { ...facts, format: { unit, style } }),
    };
  }),
);

const marksOf = (page: Sheet): Mark[] => page.groups.flatMap((group) => group.marks);
const textsOf = (page: Sheet): TextMark[] => marksOf(page).filter((mark) => mark.type === 'text');

function boxOf(mark: Mark): Box | null {
  if (mark.type === 'symbol') return mark.box;
  if (mark.type === 'polyline') {
    const [xs, ys] = [mark.points.map(({ x }) => x), mark.points.map(({ y }) => y)];
    const box: Box = [Math.min(...xs), Math.min(...ys), Math.max(...xs), Math.max(...ys)];
    // Only boxes to tick: they must stay clear of lettering.
    return mark.closed && box[2] - box[0] < 3.5 && box[3] - box[1] < 3.5 && box[2] - box[0] > 2.5
      ? box
      : null;
  }
  if (mark.type !== 'text') return null;
  return [mark.x, mark.y - 0.73 * mark.size, mark.x + 0.6 * mark.size * [...mark.text].length, mark.y];
}

function overlaps(page: Sheet): string[] {
  const boxes = marksOf(page).flatMap((mark) => {
    const box = boxOf(mark);
    return box ? [{ box, text: mark.type === 'text' ? mark.text : mark.type }] : [];
  });
  return boxes.flatMap((a, index) =>
    boxes
      .slice(index + 1)
      .filter(
        ({ box: b }) =>
          a.box[0] < b[2] - 0.05 &&
          b[0] < a.box[2] - 0.05 &&
          a.box[1] < b[3] - 0.05 &&
          b[1] < a.box[3] - 0.05,
      )
      .map((b) => `${a.text} | ${b.text}`),
  );
}

describe.each(cases)('the route card of $name', ({ route, pages }) => {
  it('letters nothing over anything, and nothing beyond its frame', () => {
    for (const page of pages) {
      expect(overlaps(page)).toEqual([]);
      for (const mark of marksOf(page)) {
        const box = boxOf(mark);
        if (!box) continue;
        expect(box[0]).toBeGreaterThanOrEqual(PAGE.left);
        expect(box[2]).toBeLessThanOrEqual(PAGE.right);
        expect(box[1]).toBeGreaterThanOrEqual(PAGE.top);
        expect(box[3]).toBeLessThanOrEqual(PAGE.bottom + 1);
      }
    }
  });

  it('says every operation once, in order, with every size it aims at and each caution of a set-up', () => {
    const numbers = pages.flatMap((page) =>
      textsOf(page).filter(
        (text) => text.weight === 700 && /^\d+$/.test(text.text) && text.x < 90 && text.x > 74,
      ),
    );
    expect(numbers.map((text) => Number(text.text))).toEqual(
      route.operations.map((operation) => operation.number),
    );
    const words = pages
      .map((page) =>
        textsOf(page)
          .map((text) => text.text)
          .join(' '),
      )
      .join(' ')
      .replace(/\s+/g, ' ');
    for (const caution of new Set(route.operations.flatMap((operation) => operation.cautions))) {
      for (const piece of caution.split('Ø'))
        expect(words).toContain(piece.trim().split(' ').slice(0, 2).join(' '));
    }
  });

  it('takes no more pages than its set-ups need, and says where a set-up goes on', () => {
    expect(pages.length).toBeLessThanOrEqual(4);
    const heads = pages.map(
      (page) =>
        textsOf(page).filter((text) => text.weight === 700 && text.text.includes(', continued')).length,
    );
    expect(heads[0]).toBe(0);
    expect(Math.max(...heads)).toBeLessThanOrEqual(1);
    const marks = pages
      .slice(0, -1)
      .map((page) =>
        Math.max(
          ...marksOf(page).map((mark) =>
            mark.type === 'polyline' && mark.closed ? Math.max(...mark.points.map(({ y }) => y)) : 0,
          ),
        ),
      );
    // No page is left half empty while the route goes on.
    for (const lowest of marks) expect(lowest).toBeGreaterThan(PAGE.top + 0.6 * (PAGE.bottom - PAGE.top));
  });
});

describe('instructions on the card', () => {
  it.each(cases)('prints each in full under its operation: $name', ({ route, pages }) => {
    const printed = pages
      .flatMap(textsOf)
      .map(({ text }) => text)
      .join(' ');
    const notes = route.operations.flatMap((operation) => operation.notes ?? []);
    expect(notes.length).toBeGreaterThan(0);
    // The diameter sign is drawn, not lettered.
    for (const word of notes.join(' ').replaceAll('Ø', '').split(' '))
      expect(printed.includes(word), word).toBe(true);
  });

  it.each(cases)('says so where sentences and columns are in different units: $name', ({ name, pages }) => {
    const printed = pages
      .flatMap(textsOf)
      .map(({ text }) => text)
      .join(' ');
    expect(printed.includes('figures within sentences are in millimetres')).toBe(name.endsWith(' in in'));
  });
});

describe('a long route', () => {
  it('is broken between operations, never with one alone at the foot or the head of a page', () => {
    const [first] = cases;
    if (!first) throw new Error('no case');
    const [setup] = first.route.setups;
    const [model] = first.route.operations;
    if (!setup || !model) throw new Error('no set-up');
    for (const count of [2, 9, 10, 11, 12, 23, 24, 25, 60]) {
      const operations = Array.from({ length: count }, (_, index): Operation => ({
        ...model,
        number: index + 1,
        setup: setup.id,
        cautions: [],
      }));
      const route: Route = { ...first.route, setups: [setup], operations };
      const pages = routeCard(route, { sizes: [] } as never, {
        ...{
          number: 'PN-1',
          letter: 'A',
          title: 'Long',
          state: 'DRAFT',
          stamp: undefined,
          entryUnit: 'mm',
          register: exampleRegister,
        },
        format: { unit: 'mm', style: 'iso' },
      });
      const onEach = pages.map(
        (page) =>
          textsOf(page).filter(
            (text) => text.weight === 700 && /^\d+$/.test(text.text) && text.x < 90 && text.x > 74,
          ).length,
      );
      expect(onEach.reduce((sum, one) => sum + one, 0)).toBe(count);
      expect(Math.min(...onEach)).toBeGreaterThanOrEqual(2);
    }
  });
});

describe('columns', () => {
  const row = (changes: Partial<Cells>): Cells => ({
    ...{
      number: '1',
      operation: '',
      stop: '',
      target: '',
      tool: '',
      speed: '',
      feed: '',
      passes: '',
      check: 'rule',
      tick: '',
    },
    ...changes,
  });

  it('have together the room there is, and figures are never cut', () => {
    const cells = [
      row({
        operation: 'turn the long journal to size',
        stop: '123.456',
        target: 'Ø12: 12.1/11.9',
        tool: 'Knife tool, right hand',
        speed: '1150',
        feed: '120/min',
        passes: '12',
      }),
    ];
    const columns = fitColumns(cells);
    expect(columns.map(({ id }) => id)).toEqual(COLUMNS.map(({ id }) => id));
    expect(columns.reduce((sum, { characters }) => sum + characters, 0)).toBeLessThanOrEqual(CHARACTERS);
    const lines = cellLines(cells[0] ?? row({}), columns);
    for (const id of ['stop', 'target', 'speed', 'feed', 'passes'] as const)
      expect(lines.get(id)).toEqual([cells[0]?.[id]]);
  });

  it('let words take the empty room beside them, and sizes stand side by side there', () => {
    const cells = [
      row({ operation: 'grip in the collet block, six-way, collet 25' }),
      row({ operation: 'measure', target: 'Ø14: 14/13.957\n60: 60.3/59.7' }),
    ];
    const columns = fitColumns(cells);
    const [grip, measure] = cells.map((one) => cellLines(one, columns));
    expect(grip?.get('operation')).toHaveLength(1);
    expect(measure?.get('target')).toEqual(['Ø14: 14/13.957   60: 60.3/59.7']);
  });

  it('keep together what a × joins', () => {
    expect(wrap('chamfer 1.5 × 45°', 12)).toEqual(['chamfer', '1.5 × 45°']);
  });
});
