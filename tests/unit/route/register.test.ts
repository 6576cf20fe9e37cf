import { describe, expect, it } from 'vitest';
import { exampleRegister } from '../../../shared/route/example-register';
import type { Register } from '../../../shared/route/register';
import { registerSchema } from '../../../shared/route/register-schema';
import { LIMITS, RULES, reasonOf } from '../../../shared/route/rules';
import { simulate } from '../../../shared/simulate/simulate';
import { materialById } from '../../../shared/standards/materials';
import { templates } from '../../../templates/index';
import { evaluate } from '../../../shared/template/evaluate';
import { buildScheme } from '../../../shared/scheme/build';
import { planRoute } from '../../../shared/route/plan';
import { plannedHandle } from './planned';

const without = (change: Partial<Register>): Register => ({ ...exampleRegister, ...change });
const tools = (keep: (tool: Register['tools'][number]) => boolean): Register =>
  without({ tools: exampleRegister.tools.filter(keep) });
const HEX = { bar: 25, acrossFlats: 22, taperEnd: 16, taperLength: 95 };

describe('the example shop', () => {
  it('has the shape of a register, each id once, and bars of known materials', () => {
    expect(registerSchema.safeParse(exampleRegister).error).toBeUndefined();
    const items = [
      ...exampleRegister.lathes, ...exampleRegister.mills, ...exampleRegister.saws, ...exampleRegister.chucks,
      ...exampleRegister.colletSets, ...exampleRegister.colletBlocks, ...exampleRegister.dividingHeads,
      ...exampleRegister.tools, ...exampleRegister.instruments, ...exampleRegister.bars,
    ]; // prettier-ignore
    const ids = items.map((item) => item.id);
    expect(ids.filter((id, index) => ids.indexOf(id) !== index)).toEqual([]);
    expect(exampleRegister.bars.filter((bar) => !materialById(bar.material)).map((bar) => bar.id)).toEqual(
      [],
    );
  });

  it('can make every worked example, and the simulator agrees', () => {
    for (const template of templates) {
      for (const example of template.examples ?? []) {
        const evaluation = evaluate(template, example.values, { entryUnit: example.entryUnit });
        const { part } = evaluation;
        if (!part) throw new Error(`${example.id} is no part`);
        const scheme = buildScheme(template, { ...evaluation, part }, { generalTolerance: 'ISO 2768-m' });
        const { route, capacity } = planRoute(part, scheme, exampleRegister, {
          quantity: 3,
          material: part.material,
        });
        expect(capacity.needs.filter((need) => need.state !== 'held')).toEqual([]);
        expect(capacity.verdict).toBe('can');
        if (route) expect(simulate(route, part)).toEqual([]);
      }
    }
  });
});

describe('a register that lacks something', () => {
  it('no lathe: no route, and the word lathe', () => {
    const { answer } = plannedHandle(HEX, without({ lathes: [] }), true);
    expect(answer.route).toBeNull();
    expect(answer.capacity.needs[0]?.why).toMatch(/no lathe/);
  });

  it('no bar thick enough: a route with what to buy', () => {
    const { capacity, route } = plannedHandle(
      HEX,
      without({ bars: exampleRegister.bars.filter((bar) => bar.size < 20) }),
    );
    expect(capacity.verdict).toBe('cannot');
    const bar = capacity.needs.find((need) => need.kind === 'bar');
    expect(bar).toMatchObject({ state: 'short' });
    expect(bar?.alternatives.join(' ')).toMatch(/buy Ø25\.5/);
    expect(route.stock.bar).toBeUndefined();
  });

  it('an empty rack is the same as none of it', () => {
    const { capacity } = plannedHandle(
      HEX,
      without({ bars: exampleRegister.bars.map((bar) => ({ ...bar, quantity: 0 })) }),
    );
    expect(capacity.needs.find((need) => need.kind === 'bar')?.why).toMatch(/no round bar of this material/);
  });

  it('nothing at all: no route, and why', () => {
    const bare = without({ lathes: [], mills: [], saws: [], chucks: [], colletSets: [], colletBlocks: [], dividingHeads: [], tools: [], instruments: [], bars: [] }); // prettier-ignore
    const { capacity } = plannedHandle(HEX, bare, true).answer;
    expect(capacity.verdict).toBe('cannot');
    expect(capacity.needs.map((need) => need.why)).toEqual(['The register has no lathe.']);
  });

  it('a lathe alone: every tool, hold, bar and instrument is a short of its own', () => {
    const bare = without({ mills: [], saws: [], chucks: [], colletSets: [], colletBlocks: [], dividingHeads: [], tools: [], instruments: [], bars: [] }); // prettier-ignore
    const { capacity } = plannedHandle(HEX, bare);
    const lacking = capacity.needs.filter((need) => need.state === 'short');
    expect(new Set(lacking.map((need) => need.kind))).toEqual(
      new Set(['bar', 'hold', 'tool', 'setting', 'instrument', 'machine']),
    );
  });

  it('no instruments: each size is a short that says how fine it must be read', () => {
    const { capacity } = plannedHandle(HEX, without({ instruments: [] }));
    const lacking = capacity.needs.filter((need) => need.kind === 'instrument' && need.state === 'short');
    expect(lacking.length).toBeGreaterThan(5);
    expect(lacking.map((need) => need.why).join(' ')).toMatch(/tenth of 0\.043/);
  });

  it('a part longer than every bed and every bar: both are said', () => {
    const rows = [
      { diameter: 90, length: 1200 },
      { diameter: 80, length: 1200 },
    ];
    const { answer } = plannedHandle({ rows }, without({ bars: exampleRegister.bars.map((bar) => ({ ...bar, length: 1000 })) }), true); // prettier-ignore
    expect(answer.capacity.verdict).toBe('cannot');
    const why = answer.capacity.needs.filter((need) => need.state === 'short').map((need) => need.why);
    expect(why.join(' ')).toMatch(/takes 1000/);
    expect(why.join(' ')).toMatch(/The rack gives 0 of 1; the longest bar is 1000/);
  });

  it('machines with no speeds written down: a short each, and figures that are still figures', () => {
    const { capacity, route } = plannedHandle(
      HEX,
      without({
        lathes: exampleRegister.lathes.map((lathe) => ({ ...lathe, speeds: [], feeds: [] })),
        mills: exampleRegister.mills.map((mill) => ({ ...mill, speeds: [], feedsPerMin: [] })),
      }),
    );
    const short = capacity.needs.filter((need) => need.state === 'short').map((need) => need.need);
    expect(short).toEqual(['the speeds of Centre lathe, long bed', 'the speeds of Turret mill']);
    expect(route.operations.every((o) => Number.isFinite(o.minutes) && o.minutes < 600)).toBe(true);
  });

  it('costs what its opened sums come to, to the penny', () => {
    for (const quantity of [1, 7]) {
      const { cost } = plannedHandle({ ...HEX, quantity }).route;
      const [setup, run, bar] = cost?.sums.map((sum) => Math.round(sum.amount * 100)) ?? [];
      expect(Math.round((cost?.each ?? 0) * 100)).toBe((run ?? NaN) + (bar ?? NaN));
      expect(Math.round((cost?.total ?? 0) * 100)).toBe(
        (setup ?? NaN) + quantity * ((run ?? NaN) + (bar ?? NaN)),
      );
    }
  });

  it('a mill whose table is shorter than the flats', () => {
    const mills = exampleRegister.mills.map((mill) => ({ ...mill, travelX: 40 }));
    const { capacity } = plannedHandle(HEX, without({ mills }));
    const short = capacity.needs.filter((need) => need.state === 'short');
    expect(short.map((need) => need.why)).toEqual(['Turret mill travels 40.']);
  });

  it('no die, thread with room to run out: single point, as another way', () => {
    const rows = [
      { diameter: 20, length: 40 },
      { diameter: 8, length: 4 },
      { diameter: 10, length: 16, thread: 'M10' },
    ];
    const { route, part, capacity } = plannedHandle(
      { rows },
      tools((tool) => tool.kind !== 'die'),
    );
    expect(route.operations.some((o) => o.method === 'thread-single-point')).toBe(true);
    expect(capacity.verdict).toBe('with-changes');
    const need = capacity.needs.find((each) => each.state === 'alternative' && each.need.startsWith('die'));
    expect(need?.alternatives.join(' ')).toMatch(/single point/);
    expect(simulate(route, part)).toEqual([]);
  });

  it('no die, thread up to a shoulder: the run-out that stays is said', () => {
    const { route, part } = plannedHandle(
      HEX,
      tools((tool) => tool.kind !== 'die'),
    );
    const thread = route.operations.find((o) => o.method === 'thread-single-point');
    expect(thread?.runOut).toBeCloseTo(3, 9);
    expect(simulate(route, part)).toEqual([]);
    const silent = {
      ...route,
      operations: route.operations.map((o) => (o === thread ? { ...o, runOut: undefined } : o)),
    };
    expect(simulate(silent, part).map((fault) => fault.rule)).toContain('thread-run-out');
  });

  it('no six-way block: the dividing head with its turns; neither: a short', () => {
    const four = without({ colletBlocks: exampleRegister.colletBlocks.filter((block) => block.faces === 4) });
    const mill = plannedHandle(HEX, four).route.operations.find((o) => o.method === 'mill-flat');
    expect(mill?.notes?.join(' ')).toMatch(/6 turns and 10 holes of 15/);
    const none = plannedHandle(HEX, { ...four, dividingHeads: [] });
    expect(none.capacity.verdict).toBe('cannot');
    expect(none.capacity.needs.some((need) => need.kind === 'setting' && need.state === 'short')).toBe(true);
  });

  it('no mill: a short that names the mill, and the rest of the route still there', () => {
    const { capacity, route } = plannedHandle(HEX, without({ mills: [] }));
    expect(capacity.needs.find((need) => need.state === 'short')?.need).toMatch(/mill/);
    expect(route.operations.length).toBeGreaterThan(10);
  });

  it('what is short, when it is supplied, turns the verdict', () => {
    const short = plannedHandle(
      HEX,
      tools((tool) => tool.kind !== 'tail-centre'),
    ).capacity;
    expect(short.verdict).toBe('cannot');
    expect(plannedHandle(HEX).capacity.verdict).toBe('can');
  });

  it('never does better than the whole shop', () => {
    const rank = { can: 0, 'with-changes': 1, cannot: 2 };
    for (const kind of new Set(exampleRegister.tools.map((tool) => tool.kind))) {
      const { answer } = plannedHandle(
        HEX,
        tools((tool) => tool.kind !== kind),
        true,
      );
      expect(rank[answer.capacity.verdict]).toBeGreaterThanOrEqual(rank.can);
      if (answer.route)
        expect(
          answer.route.operations.every(
            (o) => exampleRegister.tools.find((t) => t.id === o.toolItem)?.kind !== kind,
          ),
        ).toBe(true);
    }
  });
});

describe('more pieces than the rack holds', () => {
  it('says how many it gives', () => {
    const { capacity } = plannedHandle({ ...HEX, quantity: 5000 });
    expect(capacity.needs.find((need) => need.kind === 'bar')).toMatchObject({ state: 'short' });
    expect(capacity.needs.find((need) => need.kind === 'bar')?.why).toMatch(/The rack gives \d+ of 5000/);
  });
});

describe('the table of rules', () => {
  it('gives each limit and rule an id, a reason and a source', () => {
    for (const entry of [...Object.values(LIMITS), ...Object.values(RULES)]) {
      expect(entry.reason).toMatch(/\.$|above|over/);
      expect(entry.source).not.toBe('');
    }
    for (const [id, rule] of Object.entries(RULES)) expect(rule.id).toBe(id);
    expect(() => reasonOf('because')).toThrow(/no rule/);
  });
});
