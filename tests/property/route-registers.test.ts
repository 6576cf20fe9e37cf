import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { exampleRegister } from '../../shared/route/example-register';
import { planRoute } from '../../shared/route/plan';
import type { PlanAnswer } from '../../shared/route/plan';
import type { Register } from '../../shared/route/register';
import type { Part } from '../../shared/part/part';
import type { Scheme } from '../../shared/scheme/scheme';
import { buildScheme } from '../../shared/scheme/build';
import { MATERIALS } from '../../shared/standards/materials';
import { evaluate } from '../../shared/template/evaluate';
import { templateById } from '../../templates/index';
import { sentencesOf } from '../unit/route/sentences';
import { pinned } from './generators/pinned';
import { steppedShaftValues } from './generators/stepped-shaft';
import { taperedHandleValues } from './generators/tapered-handle';

const SHOP_SEED = 5_118_203;
const LISTS = ['lathes', 'mills', 'saws', 'chucks', 'colletSets', 'colletBlocks', 'dividingHeads', 'tools', 'instruments', 'bars'] as const; // prettier-ignore
type ListName = (typeof LISTS)[number];
const RANK = { can: 0, 'with-changes': 1, cannot: 2 } as const;

interface Asked {
  part: Part;
  scheme: Scheme;
}

function parts(): Asked[] {
  const from = (id: string, count: number): Asked[] => {
    const template = templateById(id);
    if (!template) throw new Error(`no template ${id}`);
    const values = id === 'stepped-shaft' ? steppedShaftValues : taperedHandleValues;
    return pinned(values, count, SHOP_SEED).map((typed) => {
      const evaluation = evaluate(template, typed, { entryUnit: 'mm' });
      if (!evaluation.part) throw new Error(JSON.stringify(evaluation.problems));
      const part = evaluation.part;
      return {
        part,
        scheme: buildScheme(template, { ...evaluation, part }, { generalTolerance: 'ISO 2768-m' }),
      };
    });
  };
  return [...from('stepped-shaft', 100), ...from('tapered-handle', 100)];
}

/** A shop that owns only what a draw keeps: whole lists gone, most of a list gone, or single things. */
interface Loss {
  empty: readonly ListName[];
  keep: number;
  seed: number;
  speedless: boolean;
}

const losses: fc.Arbitrary<Loss> = fc.record({
  empty: fc.oneof(
    { weight: 3, arbitrary: fc.constant([]) },
    { weight: 1, arbitrary: fc.subarray([...LISTS], { maxLength: 3 }) },
  ),
  keep: fc.constantFrom(0.3, 0.9, 0.97, 0.99),
  seed: fc.integer({ min: 1, max: 1_000_000 }),
  speedless: fc.integer({ min: 0, max: 9 }).map((n) => n === 0),
});

/** A number in [0, 1) that depends on the seed and the id alone. */
function draw(seed: number, id: string): number {
  let hash = seed;
  for (const letter of id) hash = (Math.imul(hash, 31) + letter.charCodeAt(0)) >>> 0;
  return (Math.imul(hash ^ (hash >>> 15), 2_246_822_519) >>> 0) / 2 ** 32;
}

function after(loss: Loss, register: Register): Register {
  const kept = (name: ListName): never => {
    const list: readonly { id: string }[] = register[name];
    return (
      loss.empty.includes(name) ? [] : list.filter(({ id }) => draw(loss.seed, id) < loss.keep)
    ) as never;
  };
  const shop: Register = { ...register, ...Object.fromEntries(LISTS.map((name) => [name, kept(name)])) };
  if (!loss.speedless) return shop;
  return {
    ...shop,
    lathes: shop.lathes.map((lathe) => ({
      ...lathe,
      speeds: [],
      feeds: [],
      pitches: [],
      threadsPerInch: [],
    })),
    mills: shop.mills.map((mill) => ({ ...mill, speeds: [], feedsPerMin: [] })),
  };
}

function plan({ part, scheme }: Asked, register: Register): PlanAnswer {
  return planRoute(part, scheme, register, { quantity: 2, material: part.material });
}

describe('shops that lack things', () => {
  const asked = parts();
  const drawn = pinned(losses, asked.length, SHOP_SEED);
  const answers = asked.map((each, index) => plan(each, after(drawn[index] as Loss, exampleRegister)));

  it('always give a verdict with its reason in words', () => {
    const silent = answers.flatMap(({ route, capacity }, index) => {
      const lacking = capacity.needs.filter((need) => need.state !== 'held');
      const said = lacking.every(({ need, why }) => need.trim() !== '' && /\w+ .*\.$/.test(why));
      const reasoned =
        capacity.verdict === 'can' ? lacking.length === 0 && route !== null : lacking.length > 0;
      return said && reasoned ? [] : [index];
    });
    expect(silent).toEqual([]);
    expect(new Set(answers.map(({ capacity }) => capacity.verdict)).size).toBe(3);
  });

  it('name no figure that is not a number', () => {
    const bad: string[] = [];
    for (const answer of answers)
      JSON.stringify(answer, (key, value: unknown) => {
        if (typeof value === 'number' && !Number.isFinite(value)) bad.push(key);
        if (typeof value === 'string' && /NaN|Infinity|undefined|\[object/.test(value)) bad.push(value);
        return value;
      });
    expect(bad).toEqual([]);
  });

  it('are never worse off for owning more', () => {
    const worse: string[] = [];
    for (const [index, each] of asked.slice(0, 50).concat(asked.slice(100, 150)).entries()) {
      const loss = drawn[index] as Loss;
      const less = plan(each, after(loss, exampleRegister)).capacity.verdict;
      const more = plan(
        each,
        after(
          { ...loss, empty: loss.empty.slice(1), keep: loss.keep + 0.2, speedless: false },
          exampleRegister,
        ),
      ).capacity.verdict;
      if (RANK[more] > RANK[less]) worse.push(`${index}: ${less} became ${more}`);
    }
    expect(worse).toEqual([]);
  });

  it('are spoken of by name, never by the id of a thing or a material', () => {
    const items: { id: string; name: string }[] = [
      ...LISTS.flatMap((name) => [...exampleRegister[name]]),
      ...MATERIALS,
    ];
    const names = items.map(({ name }) => name.toLowerCase());
    const ids = items.map(({ id }) => id).filter((id) => !names.some((name) => name.includes(id)));
    expect(ids.length).toBeGreaterThan(100);
    const one = new RegExp(
      `(?<![\\w-])(${ids.map((id) => id.replace(/[.+*?]/g, '\\$&')).join('|')})(?![\\w-])`,
    );
    const full = asked.filter((_, index) => index % 10 === 0).map((each) => plan(each, exampleRegister));
    const named = [...answers, ...full].flatMap(sentencesOf).filter((sentence) => one.test(sentence));
    expect([...new Set(named)]).toEqual([]);
  });
});
