import { describe, expect, it } from 'vitest';
import { foot } from '../../../shared/drawing/passes/title-block';
import { wrapWords } from '../../../shared/drawing/passes/cell-words';
import { textBoxesOf } from '../../../shared/drawing/strokes';
import type { Mark, TitleBlock } from '../../../shared/drawing/sheet';
import { boxesMeet } from '../../../shared/drawing/geometry/box';
import { depotTitle } from '../../corpus/sheet-of';

const footOf = (title: Partial<TitleBlock>) =>
  foot({ size: 'A4', style: 'iso', unit: 'mm', scaleText: '1:1', title: { ...depotTitle, ...title } });
const words = (marks: readonly Mark[]): string[] => marks.flatMap((m) => (m.type === 'text' ? [m.text] : []));
const blockOf = (title: Partial<TitleBlock>): readonly Mark[] =>
  footOf(title).groups.find((g) => g.role === 'title-block')?.marks ?? [];

describe('the title block', () => {
  it('cuts nothing: the commonest steel, long names and an 80-character title stand in full', () => {
    const title = 'Spindle A--B -> sluice, Überlauf Étage é, No 3 of the northern paddle gear frame';
    const material = 'Free-cutting low-carbon steel 230M07, certified PN-2026-0417';
    const marks = blockOf({
      title,
      materialText: material,
      stockText: 'round 25',
      drawn: { by: 'Ines Carrow-Featherstonehaugh', date: '2026-12-01' },
      state: 'DRAFT',
    });
    const said = words(marks).join(' ');
    expect(said).not.toContain('…');
    for (const part of [title, `${material}; round 25`, '2026-12-01']) expect(said).toContain(part);
    expect(words(marks).join('')).toContain('Ines Carrow-Featherstonehaugh'.replace(' ', ''));
    const boxes = textBoxesOf(marks);
    boxes.forEach((a, i) => boxes.slice(i + 1).forEach((b) => expect(boxesMeet(a, b, -0.01)).toBe(false)));
  });

  it('lets a table of tolerances by decimal places stand in a row of its own', () => {
    const generalTolerance = '.X ±.030  .XX ±.010  .XXX ±.005  .XXXX ±.0005  ANGLES ±0.5°';
    expect(words(blockOf({ generalTolerance }))).toContain(generalTolerance);
    expect(footOf({ generalTolerance }).block[1]).toBeLessThan(footOf({}).block[1]);
  });

  it('gives every state its own border, in one ink', () => {
    const borders = ['DRAFT', 'TRIAL', 'IN REVIEW', 'RELEASED', 'SUPERSEDED', 'WITHDRAWN'].map((state) =>
      JSON.stringify(
        blockOf({ state: `${state} 2026-03-09` })
          .filter((m) => m.type === 'line' && m.x2 < 120 && m.x1 < 120)
          .map((m) => ('line' in m ? [m.line, m] : [])),
      ),
    );
    expect(new Set(borders).size).toBe(borders.length);
  });

  it('writes the state with its date, and that of the signature where it has none', () => {
    const checked = { by: 'checker 1', date: '2026-03-11' };
    expect(words(blockOf({ state: 'WITHDRAWN 2026-05-02' }))).toEqual(
      expect.arrayContaining(['WITHDRAWN', '2026-05-02']),
    );
    const released = words(blockOf({ state: 'RELEASED', checked }));
    expect(released.filter((t) => t === '2026-03-11')).toHaveLength(2);
    expect(words(blockOf({ state: 'SUPERSEDED', stateDate: '2026-06-01' }))).toContain('2026-06-01');
  });
});

describe('words in lines', () => {
  it('breaks at spaces and keeps every character', () => {
    const text = 'a bb ccc dddddddddddd e';
    const lines = wrapWords(text, 1 / 0.6, 5);
    expect(lines).toEqual(['a bb', 'ccc', 'ddddd', 'ddddd', 'dd e']);
    expect(wrapWords('', 1, 5)).toEqual(['']);
  });
});
