import type { Body, Generator } from '../../../shared/part/body';
import { constant, slice } from '../../../shared/part/generator';
import type { Part } from '../../../shared/part/part';
import type { Removal } from '../../../shared/part/removal';
import type { Operation, Route, SetUp } from '../../../shared/route/route';
import { restate } from '../../property/sabotage';
import { built, hexHandle, thread } from '../part/sample-parts';

/** Routes written by hand, as a machinist would, to judge the judge by: nothing of the planner is in them. */
export interface HandMade {
  part: Part;
  route: Route;
}

type Given = Partial<Operation> & Pick<Operation, 'method' | 'setup'>;

function operation(given: Given, number: number): Operation {
  return {
    number,
    title: given.title ?? given.method,
    end: 'right',
    features: [],
    machine: 'lathe',
    tool: 'tool',
    speed: given.cut ? 500 : 0,
    surfaceSpeed: 0,
    feed: 0.1,
    feedPer: 'rev',
    depthOfCut: given.cut ? 0.25 : 0,
    passes: given.cut ? 1 : 0,
    minutes: 1,
    removes: 0,
    after: [],
    stops: [],
    target: [],
    reasons: [],
    cautions: [],
    check: '',
    ...given,
  };
}

function setup(given: Pick<SetUp, 'id' | 'gripFrom' | 'gripTo' | 'freeEnd'> & Partial<SetUp>): SetUp {
  return { machine: 'lathe', holding: 'three-jaw chuck', heldText: '', datumText: '', minutes: 5, ...given };
}

function bar(from: number, to: number, diameter: number): Body {
  return {
    x0: from,
    x1: to,
    outer: constant(from, to, diameter / 2),
    inner: constant(from, to, 0),
    cuts: [],
    treatments: [],
  };
}

const ring = (from: number, to: number, radius: number): Removal => ({
  kind: 'outer',
  envelope: constant(from, to, radius),
});
const own = (part: Part, from: number, to: number): Removal => ({
  kind: 'outer',
  envelope: slice(part.body.outer, from, to),
});
const slope = (from: number, to: number, start: number, end: number): Removal => ({
  kind: 'outer',
  envelope: [{ kind: 'line', from, to, start, end }],
});

function stop(from: string, fromX: number, toX: number) {
  return { from, fromX, toX, length: Math.abs(toX - fromX) };
}

function route(part: Part, diameter: number, blank: Body, setups: SetUp[], given: Given[]): HandMade {
  const draft: Route = {
    stock: { shape: 'round', size: diameter, material: part.material, certified: false },
    blankLength: blank.x1 - blank.x0,
    blank,
    setups,
    operations: given.map((each, index) => operation(each, index + 1)),
    stages: [],
    volumes: { blank: 0, removed: 0, kerf: 0, remnant: 0, part: 0 },
    minutes: { setup: 0, run: 0 },
    kitting: [],
    others: [],
  };
  return { part, route: restate(draft, part) };
}

const wait = (rule: string, ...numbers: number[]) => numbers.map((number) => ({ operation: number, rule }));

/** Shaft with a centre that stays: worked from the bar's end with the tail in, parted, turned round, faced. */
export function shaftRoute(): HandMade {
  const part = built({
    lengths: [
      { form: 'cylinder', id: 'head', length: 15, diameter: 28 },
      { form: 'cylinder', id: 'seat', length: 25, diameter: 20 },
      { form: 'cylinder', id: 'end', length: 20, diameter: 12 },
    ],
    chamfers: [
      { id: 'head-chamfer', on: 'head', end: 'left', leg: 1 },
      { id: 'end-chamfer', on: 'end', end: 'right', leg: 1.75 },
    ],
    threads: [{ id: 'end-thread', on: 'end', spec: thread('M12-6g'), fullThread: 15, end: 'right' }],
    centreHoles: [{ id: 'centre', end: 'right', designation: 'A2' }],
  });
  const { length } = part;
  const hole: Generator = slice(part.body.inner, 50, length).filter(
    (piece) => piece.kind === 'line' && piece.start > 0,
  );
  const [treatment] = part.body.treatments;
  if (!treatment) throw new Error('no thread');
  const face = (toX: number, fromX = length) => [stop('A.face', fromX, toX)];
  return route(
    part,
    30,
    bar(-40, length + 1, 30),
    [
      setup({ id: 'A', gripFrom: -38, gripTo: -8, freeEnd: 'right', support: 'centre' }),
      setup({ id: 'B', gripFrom: 20, gripTo: 38, freeEnd: 'left' }),
    ],
    [
      { method: 'saw', setup: 'A' },
      { method: 'grip', setup: 'A', after: wait('saw-first', 1) },
      {
        method: 'face',
        setup: 'A',
        features: ['right-face'],
        cut: { kind: 'trim', from: -40, to: length },
        passes: 4,
        after: wait('grip-first', 2),
      },
      {
        method: 'centre-drill',
        setup: 'A',
        features: ['centre'],
        cut: { kind: 'bore', envelope: hole },
        after: wait('face-before-centre', 3),
      },
      {
        method: 'rough-turn',
        title: 'rough the head',
        setup: 'A',
        features: ['head', 'seat', 'end'],
        cut: ring(-3.5, length, 14.25),
        passes: 1,
        depthOfCut: 0.75,
        stops: face(-3.5),
        after: wait('centre-before-support', 4),
      },
      {
        method: 'rough-turn',
        title: 'rough the seat',
        setup: 'A',
        features: ['seat', 'end'],
        cut: ring(15, length, 10.25),
        passes: 4,
        depthOfCut: 1,
        stops: face(15),
        after: wait('rough-large-first', 5),
      },
      {
        method: 'rough-turn',
        title: 'rough the end',
        setup: 'A',
        features: ['end', 'end-thread'],
        cut: ring(40, length, 6.25),
        passes: 4,
        depthOfCut: 1,
        stops: face(40),
        after: wait('rough-large-first', 6),
      },
      {
        method: 'turn',
        setup: 'A',
        features: ['head'],
        cut: ring(-3.5, 15, 14),
        stops: face(-3.5),
        after: wait('rough-before-finish', 7),
      },
      {
        method: 'turn',
        setup: 'A',
        features: ['seat'],
        cut: ring(15, 40, 10),
        stops: face(15),
        after: wait('rough-before-finish', 7),
      },
      {
        method: 'turn',
        setup: 'A',
        features: ['end'],
        cut: ring(40, length, 6),
        stops: face(40),
        after: wait('rough-before-finish', 7),
      },
      {
        method: 'chamfer',
        setup: 'A',
        features: ['end-chamfer'],
        cut: own(part, length - 1.75, length),
        passes: 7,
        stops: face(length - 1.75),
        after: wait('row-before-chamfer', 10),
      },
      {
        method: 'thread-die',
        setup: 'A',
        features: ['end-thread'],
        speed: 60,
        blankDiameter: 11.9,
        cut: { kind: 'treatment', treatment },
        stops: face(45),
        after: wait('chamfer-before-thread', 11),
      },
      {
        method: 'part-off',
        setup: 'A',
        features: [],
        depthOfCut: 14,
        stops: face(-0.5),
        cut: { kind: 'sever', from: -0.5, to: length, kerfFrom: -3.5, kerfTo: -0.5 },
        after: wait('part-last', 12),
      },
      { method: 'turn-round', setup: 'B', end: 'left', after: wait('turn-round', 13) },
      { method: 'indicate', setup: 'B', end: 'left', after: wait('grip-first', 14) },
      {
        method: 'face',
        setup: 'B',
        end: 'left',
        features: ['left-face'],
        passes: 2,
        cut: { kind: 'trim', from: 0, to: length },
        stops: [stop('head.end', 15, 0)],
        after: wait('indicate-before-cut', 15),
      },
      {
        method: 'chamfer',
        setup: 'B',
        end: 'left',
        features: ['head-chamfer'],
        passes: 4,
        cut: own(part, 0, 1),
        stops: [stop('B.face', 0, 1)],
        after: wait('trim-before-end-form', 16),
      },
      { method: 'deburr', setup: 'B', end: 'left', after: wait('edges-last', 17) },
      {
        method: 'fit-check',
        setup: 'B',
        end: 'left',
        features: ['end-thread'],
        after: wait('fit-before-inspect', 12),
      },
      { method: 'inspect', setup: 'B', end: 'left', after: wait('inspect-last', 18, 19) },
    ],
  );
}

/** Hexagon handle from round bar: thread end, flats on the mill, turned round on its spigot for taper and crown. */
export function handleRoute(): HandMade {
  const part = hexHandle();
  const { length } = part;
  const [treatment] = part.body.treatments;
  const [flats] = part.body.cuts;
  const crown = part.features.find((feature) => feature.kind === 'crown');
  if (!treatment || flats?.kind !== 'flats' || crown?.kind !== 'crown') throw new Error('not the handle');
  const end = length + 8;
  const seat = (5.3 - 2.5) / 2 / Math.tan(Math.PI / 6);
  const hole: Removal = {
    kind: 'bore',
    envelope: [
      { kind: 'line', from: end - seat - 2.2, to: end - seat, start: 1.25, end: 1.25 },
      { kind: 'line', from: end - seat, to: end, start: 1.25, end: 2.65 },
    ],
  };
  const thin = { from: 'A.face', fromX: 0 };
  return route(
    part,
    20,
    bar(-1, end + 1, 20),
    [
      setup({ id: 'A', gripFrom: 27, gripTo: 60, freeEnd: 'left' }),
      setup({
        id: 'M',
        machine: 'mill',
        holding: 'dividing head',
        gripFrom: 100,
        gripTo: 132,
        freeEnd: 'left',
        support: 'outboard',
      }),
      setup({ id: 'B', gripFrom: 18, gripTo: 26, freeEnd: 'right', support: 'centre' }),
    ],
    [
      { method: 'saw', setup: 'A', end: 'left' },
      { method: 'grip', setup: 'A', end: 'left', after: wait('saw-first', 1) },
      {
        method: 'face',
        setup: 'A',
        end: 'left',
        features: ['left-face'],
        passes: 4,
        cut: { kind: 'trim', from: 0, to: end + 1 },
        after: wait('grip-first', 2),
      },
      {
        method: 'rough-turn',
        title: 'rough the spigot',
        setup: 'A',
        end: 'left',
        features: ['spigot', 'thread-length'],
        passes: 4,
        depthOfCut: 1,
        cut: ring(0, 26, 6.75),
        stops: [{ ...thin, toX: 26, length: 26 }],
        after: wait('datum-first', 3),
      },
      {
        method: 'rough-turn',
        title: 'rough the thread',
        setup: 'A',
        end: 'left',
        features: ['thread-length'],
        passes: 2,
        depthOfCut: 1,
        cut: ring(0, 18, 5.25),
        stops: [{ ...thin, toX: 18, length: 18 }],
        after: wait('rough-large-first', 4),
      },
      {
        method: 'turn',
        setup: 'A',
        end: 'left',
        features: ['spigot'],
        cut: ring(18, 26, 6.5),
        stops: [{ ...thin, toX: 26, length: 26 }],
        after: wait('rough-before-finish', 5),
      },
      {
        method: 'turn',
        setup: 'A',
        end: 'left',
        features: ['thread-length'],
        cut: ring(0, 18, 5),
        stops: [{ ...thin, toX: 18, length: 18 }],
        after: wait('rough-before-finish', 5),
      },
      {
        method: 'chamfer',
        setup: 'A',
        end: 'left',
        features: ['lead'],
        passes: 5,
        cut: own(part, 0, 1.25),
        stops: [{ ...thin, toX: 1.25, length: 1.25 }],
        after: wait('row-before-chamfer', 7),
      },
      {
        method: 'thread-die',
        setup: 'A',
        end: 'left',
        features: ['thread'],
        speed: 60,
        blankDiameter: 9.9,
        cut: { kind: 'treatment', treatment },
        stops: [{ ...thin, toX: 18, length: 18 }],
        after: wait('chamfer-before-thread', 8),
      },
      { method: 'grip', setup: 'M', end: 'side', machine: 'mill', after: wait('turn-before-mill', 6) },
      { method: 'mark-out', setup: 'M', end: 'side', features: ['hexagon'], after: wait('grip-first', 10) },
      {
        method: 'mill-flat',
        setup: 'M',
        end: 'side',
        machine: 'mill',
        features: ['hexagon'],
        feedPer: 'min',
        depth: 1.25,
        faces: 6,
        passes: 1,
        depthOfCut: 1.25,
        cut: { kind: 'cut', cut: { ...flats, to: 94 } },
        stops: [{ from: 'M.face', fromX: 0, toX: 26, length: 26 }],
        after: wait('mark-before-mill', 11),
      },
      { method: 'turn-round', setup: 'B', after: wait('flats-before-taper', 12) },
      {
        method: 'face',
        setup: 'B',
        features: ['right-face'],
        passes: 4,
        cut: { kind: 'trim', from: 0, to: end },
        after: wait('grip-first', 13),
      },
      { method: 'centre-drill', setup: 'B', features: [], cut: hole, after: wait('face-before-centre', 14) },
      {
        method: 'taper-turn',
        setup: 'B',
        features: ['taper'],
        passes: 4,
        depthOfCut: 1,
        halfAngle: (Math.atan(3 / 60) * 180) / Math.PI,
        slantLength: 60.1,
        settings: 1,
        cut: slope(66, end, 10, 10 - (3 * 68) / 60),
        stops: [{ from: 'B.face', fromX: end, toX: 66, length: end - 66 }],
        after: wait('centre-before-support', 15),
      },
      {
        method: 'part-off',
        title: 'cut off the centre',
        setup: 'B',
        features: ['right-face'],
        depthOfCut: 7,
        cut: { kind: 'sever', from: 0, to: length, kerfFrom: length, kerfTo: length + 3 },
        stops: [{ from: 'B.face', fromX: end, toX: length, length: 8 }],
        after: wait('support-before-trim', 16),
      },
      {
        method: 'form-turn',
        setup: 'B',
        features: ['crown'],
        passes: 10,
        cut: own(part, crown.from, length),
        after: wait('trim-before-end-form', 17),
      },
      { method: 'deburr', setup: 'B', after: wait('edges-last', 18) },
      { method: 'fit-check', setup: 'B', features: ['thread'], after: wait('fit-before-inspect', 9) },
      { method: 'inspect', setup: 'B', after: wait('inspect-last', 19, 20) },
    ],
  );
}
