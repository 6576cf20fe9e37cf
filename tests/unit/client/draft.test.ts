import { describe, expect, it } from 'vitest';
import {
  differences,
  merged,
  rowsOf,
  textAt,
  withRowAdded,
  withRowMoved,
  withRowRemoved,
  withText,
  type Draft,
} from '../../../src/revision/draft';

const draft = (values: Draft['values'], changes: Partial<Draft> = {}): Draft => ({
  title: 'Sluice-gear spindle',
  note: '',
  entryUnit: 'mm',
  settings: { unit: 'mm', style: 'iso', sheet: 'auto', scale: 'auto', balloons: true },
  values,
  ...changes,
});
const steps = {
  steps: [
    { key: 'a', diameter: '20', length: '30' },
    { key: 'b', diameter: '25', length: '40' },
  ],
};

describe('values as typed', () => {
  it('reads and writes a plain value and a cell of a table by its path', () => {
    expect(textAt(steps, 'steps[1].diameter')).toBe('25');
    expect(textAt(steps, 'steps[5].diameter')).toBe('');
    expect(textAt(withText(steps, 'steps[1].diameter', '26 h6'), 'steps[1].diameter')).toBe('26 h6');
    expect(withText({ a: '1' }, 'b', '2')).toEqual({ a: '1', b: '2' });
    expect(steps.steps[1]?.diameter).toBe('25');
  });

  it('adds, removes and moves rows, each with its own key', () => {
    const keys = (values: Draft['values']) => rowsOf(values, 'steps').map(({ key }) => key);
    expect(keys(withRowAdded(steps, 'steps', 'c', { length: '5' }))).toEqual(['a', 'b', 'c']);
    expect(keys(withRowMoved(steps, 'steps', 0, 1))).toEqual(['b', 'a']);
    expect(keys(withRowMoved(steps, 'steps', 0, -1))).toEqual(['a', 'b']);
    expect(keys(withRowRemoved(steps, 'steps', 0))).toEqual(['b']);
  });
});

describe('two drafts that both changed', () => {
  const mine = draft({ gripLength: '40', taperLength: '95' });
  const theirs = draft(
    { gripLength: '45', taperLength: '95', endSize: '20' },
    { settings: { unit: 'in', style: 'iso', sheet: 'auto', scale: 'auto', balloons: true } },
  );

  it('names every figure that differs and nothing else', () => {
    expect(differences(mine, theirs)).toEqual([
      { path: 'settings.unit', mine: 'mm', theirs: 'in' },
      { path: 'gripLength', mine: '40', theirs: '45' },
      { path: 'endSize', mine: '', theirs: '20' },
    ]);
    expect(differences(mine, mine)).toEqual([]);
  });

  it('takes theirs with what was picked of mine', () => {
    const both = merged(mine, theirs, new Set(['gripLength']));
    expect(both.values).toEqual({ gripLength: '40', taperLength: '95', endSize: '20' });
    expect(both.settings.unit).toBe('in');
    const allMine = merged(mine, theirs, new Set(differences(mine, theirs).map(({ path }) => path)));
    expect(allMine).toEqual(mine);
  });

  it('keeps the title of the sheet and of the record the same', () => {
    const a = draft({ title: 'Pawl pin' }, { title: 'Pawl pin' });
    const b = draft({ title: 'Pawl' }, { title: 'Pawl' });
    expect(differences(a, b)).toEqual([{ path: 'title', mine: 'Pawl pin', theirs: 'Pawl' }]);
    expect(merged(a, b, new Set(['title']))).toEqual(a);
  });
});
