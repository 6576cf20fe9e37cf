import { describe, expect, it } from 'vitest';
import { constant } from '../../../shared/part/generator';
import type { Operation, Route, SetUp } from '../../../shared/route/route';
import { simulate } from '../../../shared/simulate/simulate';
import { restate } from '../../property/sabotage';
import type { HandMade } from './hand-made';
import { handleRoute, shaftRoute } from './hand-made';

type Rewrite = (route: Route) => Partial<Route>;

/** Rules that a hand-made route breaks once it is rewritten, its bookkeeping done again. */
function broken(made: HandMade, rewrite: Rewrite): string[] {
  const route = restate({ ...made.route, ...rewrite(made.route) }, made.part);
  return simulate(route, made.part).map((fault) => fault.rule);
}

const change =
  (method: Operation['method'], patch: Partial<Operation>): Rewrite =>
  (route) => ({
    operations: route.operations.map((each) => (each.method === method ? { ...each, ...patch } : each)),
  });

const hold =
  (id: string, patch: Partial<SetUp>): Rewrite =>
  (route) => ({ setups: route.setups.map((each) => (each.id === id ? { ...each, ...patch } : each)) });

const moved =
  (from: number, to: number): Rewrite =>
  (route) => {
    const operations = route.operations.map((each) => ({ ...each, after: [] }));
    const [taken] = operations.splice(from - 1, 1);
    if (!taken) throw new Error('no such operation');
    operations.splice(to - 1, 0, taken);
    return { operations };
  };

describe('single rules', () => {
  it('a hold must be on metal, plain, long enough, not absurd, with nothing larger behind', () => {
    const shaft = shaftRoute();
    expect(broken(shaft, hold('A', { gripFrom: -60, gripTo: -30 }))).toContain('grip-metal');
    expect(broken(shaft, hold('B', { gripFrom: 5, gripTo: 30 }))).toContain('grip-plain');
    expect(broken(shaft, hold('B', { gripFrom: 30, gripTo: 34 }))).toContain('grip-length');
    expect(broken(handleRoute(), hold('A', { gripFrom: 27, gripTo: 120 }))).toContain('grip-length');
    expect(broken(handleRoute(), hold('M', { gripFrom: 28, gripTo: 60 }))).toContain('grip-uncut');
    // Turned round on its seat the larger head would stand behind the jaws.
    expect(broken(shaft, hold('B', { freeEnd: 'right' }))).toContain('grip-behind');
  });

  it('milled flats are not held, unless the route says that three jaws close on a whole polygon', () => {
    const made = handleRoute();
    const onFlats = (patch: Partial<SetUp>): string[] =>
      broken(made, hold('B', { gripFrom: 30, gripTo: 60, ...patch }));
    expect(onFlats({})).toContain('grip-plain');
    expect(onFlats({ heldOn: 'flats' })).not.toContain('grip-plain');
    expect(onFlats({ heldOn: 'flats', gripFrom: 18, gripTo: 40 })).toContain('grip-plain');
  });

  it('a blade passes clear of the jaws', () => {
    expect(broken(shaftRoute(), hold('A', { gripFrom: -38, gripTo: -5 }))).toContain('parting-clear');
  });

  it('nothing is turned into a finished thread', () => {
    expect(broken(shaftRoute(), moved(12, 10))).toEqual(
      expect.arrayContaining(['nothing-after-finish', 'blank-before-thread']),
    );
  });

  it('a thread waits for its chamfer and for the smaller diameter beside it', () => {
    expect(broken(shaftRoute(), moved(12, 11))).toContain('chamfer-before-thread');
  });

  it('a hole comes in from the faced end', () => {
    expect(broken(shaftRoute(), moved(4, 3))).toEqual(
      expect.arrayContaining(['face-before-centre', 'way-in']),
    );
  });

  it('a single-point thread does not end against a shoulder', () => {
    const handle = handleRoute();
    expect(broken(handle, change('thread-die', { method: 'thread-single-point', speed: 60 }))).toContain(
      'thread-run-out',
    );
    expect(
      broken(shaftRoute(), change('thread-die', { method: 'thread-single-point', speed: 60 })),
    ).not.toContain('thread-run-out');
  });

  it('a run-out that the card states is room enough: a pitch at least, and less than the thread', () => {
    const made = handleRoute();
    const [thread] = made.part.body.treatments;
    if (thread?.kind !== 'thread') throw new Error('no thread');
    const cut = (runOut: number): string[] =>
      broken(made, change('thread-die', { method: 'thread-single-point', speed: 60, runOut }));
    expect(cut(thread.pitch)).not.toContain('thread-run-out');
    expect(cut(2 * thread.pitch)).not.toContain('thread-run-out');
    expect(cut(0.9 * thread.pitch)).toContain('thread-run-out');
    expect(cut(thread.to - thread.from)).toContain('thread-run-out');
  });

  it('three jaws do not sit on flats whose number they do not divide', () => {
    const square: Rewrite = (route) => ({
      ...hold('B', { gripFrom: 30, gripTo: 60, heldOn: 'flats' })(route),
      operations: route.operations.map((each) =>
        each.method === 'mill-flat' && each.cut?.kind === 'cut' && each.cut.cut.kind === 'flats'
          ? { ...each, faces: 4, cut: { ...each.cut, cut: { ...each.cut.cut, count: 4 } } }
          : each,
      ),
    });
    expect(broken(handleRoute(), square)).toContain('grip-plain');
  });

  it('a groove in what is parted off is the work of no feature; one in the part is of some', () => {
    const grooved =
      (from: number, to: number): Rewrite =>
      (route) => {
        const at = route.operations.findIndex((each) => each.method === 'part-off');
        const groove = {
          ...(route.operations[at] as Operation),
          method: 'groove' as const,
          features: [],
          cut: { kind: 'outer' as const, envelope: constant(from, to, 12) },
          depthOfCut: 1,
          passes: 2,
          stops: [],
          after: [],
        };
        const operations = route.operations.map((each) => ({ ...each, after: [] as Operation['after'] }));
        operations.splice(at, 0, groove);
        return { operations };
      };
    expect(broken(shaftRoute(), grooved(-3.5, -0.5))).not.toContain('named-features');
    expect(broken(shaftRoute(), grooved(-3.5, 1))).toEqual(
      expect.arrayContaining(['named-features', 'not-below-part']),
    );
  });

  it('facing far out is judged by how much the work bends, not by how far it stands out', () => {
    const faced = (depthOfCut: number): string[] =>
      broken(handleRoute(), (route) => ({
        operations: route.operations.map((each) =>
          each.setup === 'B' && each.method === 'face' ? { ...each, depthOfCut } : each,
        ),
      }));
    expect(faced(0.25).filter((rule) => rule.startsWith('support'))).toEqual([]);
    expect(faced(8)).toContain('support-bend');
    expect(faced(8)).not.toContain('support-overhang');
  });

  it('the chamfer at the tip of a thread does not count as its thinnest place', () => {
    // Jaws at 24: the thread stands out 36, three times its own 12, though 4.2 times the small end of its chamfer.
    const overhung = (gripTo: number): boolean => {
      const made = shaftRoute();
      const route = {
        ...made.route,
        ...hold('A', { gripFrom: gripTo - 30, gripTo, support: undefined })(made.route),
        ...change('thread-die', { method: 'thread-single-point', speed: 60 })(made.route),
      };
      const thread = route.operations.find((each) => each.method === 'thread-single-point');
      return simulate(restate(route, made.part), made.part).some(
        (fault) => fault.rule === 'support-overhang' && fault.operation === thread?.number,
      );
    };
    expect(overhung(24)).toBe(false);
    expect(overhung(20)).toBe(true);
  });

  it('a heavy cut on slender work bends it', () => {
    expect(broken(handleRoute(), change('form-turn', { depthOfCut: 5 }))).toEqual(
      expect.arrayContaining(['support-overhang', 'support-bend']),
    );
    expect(broken(handleRoute(), change('taper-turn', { depthOfCut: 60 }))).toContain('support-bend');
  });

  it('roughing is done before finishing, the largest first', () => {
    expect(broken(shaftRoute(), moved(8, 7))).toContain('rough-before-finish');
    expect(broken(shaftRoute(), moved(6, 5))).toContain('rough-large-first');
  });

  it('flats are milled before the taper that trims them, from a turned round', () => {
    const late: Rewrite = (route) => {
      const operations = route.operations.map((each) => ({ ...each, after: [] }));
      const mill = operations.filter((each) => each.setup === 'M');
      const rest = operations.filter((each) => each.setup !== 'M');
      const at = rest.findIndex((each) => each.method === 'form-turn') + 1;
      return { operations: [...rest.slice(0, at), ...mill, ...rest.slice(at)] };
    };
    expect(broken(handleRoute(), late)).toContain('flats-before-taper');
  });

  it('a set-up is whole, and its grip the first thing', () => {
    expect(broken(handleRoute(), moved(3, 11))).toContain('set-up-whole');
    expect(broken(handleRoute(), moved(11, 10))).toContain('grip-first');
  });

  it('an edge that waits for a later operation, or for a rule nobody knows, is refused', () => {
    const wait = (operation: number, rule: string): Rewrite =>
      change('mill-flat', { after: [{ operation, rule }] });
    const made = handleRoute();
    const judged = (rewrite: Rewrite): string[] =>
      simulate({ ...made.route, ...rewrite(made.route) }, made.part).map((fault) => fault.rule);
    expect(judged(wait(15, 'turn-before-mill'))).toEqual(['waits-for-earlier']);
    expect(judged(wait(3, 'because'))).toEqual(['waits-for-earlier']);
  });

  it('a wider cut than the part allows is named at the operation that makes it', () => {
    const made = shaftRoute();
    const operations = made.route.operations.map((each) =>
      each.number === 9 ? { ...each, cut: { kind: 'outer', envelope: constant(14, 40, 10) } as const } : each,
    );
    const faults = simulate(restate({ ...made.route, operations }, made.part), made.part);
    expect(faults.filter((fault) => fault.rule === 'not-below-part').map((fault) => fault.operation)).toEqual(
      [9],
    );
  });

  it('figures that are no numbers are refused, not crashed on', () => {
    const made = shaftRoute();
    const spoil = (patch: Partial<Operation>): Route => ({
      ...made.route,
      operations: made.route.operations.map((each) => (each.number === 9 ? { ...each, ...patch } : each)),
    });
    expect(simulate(spoil({ removes: Number.NaN }), made.part).map((fault) => fault.rule)).toContain(
      'removes-metal',
    );
    expect(simulate(spoil({ speed: Number.NaN }), made.part).map((fault) => fault.rule)).toContain(
      'figures-fit',
    );
    expect(simulate(spoil({ depthOfCut: Number.NaN }), made.part).map((fault) => fault.rule)).toContain(
      'figures-fit',
    );
    expect(simulate(spoil({ setup: 'Z' }), made.part).map((fault) => fault.rule)).toContain(
      'can-be-replayed',
    );
  });
});
