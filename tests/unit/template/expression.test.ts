import { describe, expect, it } from 'vitest';
import { compileExpression, ExpressionError } from '../../../shared/template/expression';
import type { ExpressionValue, Scope } from '../../../shared/template/scope';
import { defineTemplate } from '../../../shared/template/define';
import { steppedShaft } from '../../../templates/stepped-shaft';

const row = (key: string, values: Record<string, ExpressionValue>) => ({
  key,
  values: new Map(Object.entries(values)),
});
const rows = [
  row('a', { length: 10, more: false }),
  row('b', { length: 20, more: true }),
  row('c', { length: 5, more: true }),
];
const scope: Scope = {
  values: new Map<string, ExpressionValue>([
    ['d', 25],
    ['l', 100],
    ['unset', null],
    ['grip', 'hex'],
    ['thread', 'M10x1.25'],
  ]),
  tables: new Map([['steps', rows]]),
  row: rows[1],
  index: 1,
};
const run = (source: string): ExpressionValue => compileExpression(source).run(scope);

describe('expressions work out', () => {
  it.each<[string, ExpressionValue]>([
    ['d / 2 + l * 3 - 2 ^ 3', 12.5 + 300 - 8],
    ['-d + 1', -24],
    ['grip == "hex" and d > 20', true],
    ['grip != "hex" or not (d <= 20)', true],
    ['d > 20 ? 1 : 2', 1],
    ['min(d, l, 3) + max(1, 2) + abs(-4) + sqrt(16)', 3 + 2 + 4 + 4],
    ['atan(1) * 4', Math.PI],
    ['row.length', 20],
    ['sumOf("steps", "length")', 35],
    ['sumBefore("steps", "length", index)', 10],
    ['valueAt("steps", "length", 2)', 5],
    ['valueAt("steps", "length", -1)', null],
    ['keyAt("steps", 0)', 'a'],
    ['runEnd("steps", "more", 0)', 2],
    ['count("steps")', 3],
    ['majorOf(thread) + pitchOf(thread)', 11.25],
    ['join("steps.", keyAt("steps", index))', 'steps.b'],
    ['given(unset)', false],
    ['either(unset, d)', 25],
  ])('%s', (source, worth) => {
    if (typeof worth === 'number') expect(run(source)).toBeCloseTo(worth, 12);
    else expect(run(source)).toBe(worth);
  });

  it('leaves unset what rests on something unset, and settles what does not', () => {
    expect(run('unset + 1')).toBeNull();
    expect(run('unset > 1')).toBeNull();
    expect(run('unset > 1 and d < 1')).toBe(false);
    expect(run('unset > 1 or d > 1')).toBe(true);
    expect(run('unset > 1 ? 1 : 2')).toBeNull();
    expect(run('min(unset, 1)')).toBeNull();
  });
});

describe('expressions refuse', () => {
  it.each([
    'a = 1',
    'f(x) = x',
    'd; l',
    '[1, 2]',
    '{a: 1}',
    'd[1]',
    'd.constructor',
    'row.length.x',
    'scope.row',
    '1 : 3',
    'import("x")',
    'evaluate("1")',
    'constructor("x")',
    'toString()',
    'd!',
    'd %  2',
    '2 d',
    '3 mm',
    'd << 1',
    'x -> y',
    '1 < 2 < 3',
    "d'",
    'null',
    '1 +',
    '',
    'min()',
    'sqrt(1, 2)',
    '(min)(1)',
    'row["length"]',
    'sumOf(1)',
  ])('%s', (source) => {
    expect(() => compileExpression(source)).toThrow();
  });

  it('what is too long, too large or too deep', () => {
    expect(() => compileExpression(`1${' + 1'.repeat(300)}`)).toThrow(ExpressionError);
    expect(() => compileExpression(`1${'+1'.repeat(150)}`)).toThrow(ExpressionError);
    expect(() => compileExpression(`${'('.repeat(40)}1${')'.repeat(40)}`)).toThrow(ExpressionError);
  });

  it('never reaches beyond the scope by a name that every object has', () => {
    for (const name of ['constructor', '__proto__', 'hasOwnProperty']) expect(run(name)).toBeNull();
  });
});

describe('a template is checked when it is loaded', () => {
  it.each([
    ['an expression that cannot be compiled', { datum: 'd = 1' }],
    ['a name that is not there', { datum: 'nowhere + 1' }],
    ['a column that is not there', { derived: [{ id: 'x', value: 'sumOf("steps", "width")' }] }],
    [
      'a constraint on no parameter',
      { constraints: [{ holds: 'true', parameter: 'width', message: 'No.' }] },
    ],
    ['a field that no template has', { colour: 'red' }],
    ['no features', { features: [] }],
  ])('%s is refused', (_, change) => {
    expect(() => defineTemplate({ ...steppedShaft, ...change })).toThrow(/stepped-shaft/);
  });
});
