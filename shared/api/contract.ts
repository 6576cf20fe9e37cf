import { z } from 'zod';

/**
 * The headless command's JSON. Lengths mm, angles degrees, volumes mm³, mass kg, times minutes, whatever the
 * sheet shows. Fields may be added; none is renamed or removed while `schemaVersion` is 1.
 */
const finite = z.number();
const end = z.enum(['left', 'right', 'both', 'side']);

export const sizeKind = z.enum([
  'length', 'diameter', 'radius', 'angle', 'taper', 'chamfer', 'thread', 'across-flats', 'knurl', 'groove', 'key', 'hole',
  'position', 'texture', 'centre-hole', 'geometrical', 'note',
]); // prettier-ignore

export const method = z.enum([
  'saw', 'grip', 'turn-round', 'mark-out', 'indicate', 'face', 'centre-drill', 'rough-turn', 'turn', 'taper-turn', 'form-turn',
  'groove', 'chamfer', 'drill', 'bore', 'counterbore', 'ream', 'tap', 'thread-die', 'thread-single-point', 'knurl', 'mill-flat',
  'mill-key', 'cross-drill', 'part-off', 'file', 'polish', 'deburr', 'fit-check', 'inspect',
]); // prettier-ignore

const feature = z.looseObject({
  id: z.string(),
  kind: z.string(),
  from: finite.optional(),
  to: finite.optional(),
});

const size = z.object({
  id: z.string(),
  balloon: z.number().int().nonnegative(),
  kind: sizeKind,
  features: z.array(z.string()),
  /** What the sheet prints, with Ø for the diameter sign. */
  text: z.string().min(1),
  nominal: finite,
  upperLimit: finite,
  lowerLimit: finite,
  from: z.string().optional(),
  to: z.string().optional(),
  reference: z.boolean(),
  toleranceSource: z.string(),
});

const piece = z.discriminatedUnion('kind', [
  z.object({ kind: z.literal('line'), from: finite, to: finite, start: finite, end: finite }),
  z.object({
    kind: z.literal('arc'),
    from: finite,
    to: finite,
    centreX: finite,
    centreR: finite,
    radius: finite,
    sign: z.union([z.literal(1), z.literal(-1)]),
  }),
]);

/** A removal as data, enough to replay it (mm, radians). */
export const removal = z.discriminatedUnion('kind', [
  z.object({ kind: z.literal('outer'), envelope: z.array(piece) }),
  z.object({ kind: z.literal('bore'), envelope: z.array(piece) }),
  z.object({ kind: z.literal('cut'), cut: z.looseObject({ kind: z.string(), id: z.string() }) }),
  z.object({
    kind: z.literal('treatment'),
    treatment: z.looseObject({ kind: z.string(), id: z.string(), from: finite, to: finite }),
  }),
  z.object({ kind: z.literal('trim'), from: finite, to: finite }),
  z.object({ kind: z.literal('sever'), from: finite, to: finite, kerfFrom: finite, kerfTo: finite }),
]);

const operation = z.object({
  number: z.number().int().positive(),
  title: z.string(),
  method,
  setup: z.string(),
  end,
  features: z.array(z.string()),
  machine: z.string(),
  tool: z.string(),
  speed: finite,
  surfaceSpeed: finite,
  feed: finite,
  feedPer: z.enum(['rev', 'min']),
  depthOfCut: finite,
  passes: z.number().int().nonnegative(),
  minutes: finite,
  removes: finite,
  cut: removal.optional(),
  after: z.array(z.object({ operation: z.number().int(), rule: z.string() })),
  stops: z.array(z.object({ from: z.string(), length: finite })),
  target: z.array(z.object({ size: z.string(), nominal: finite, upperLimit: finite, lowerLimit: finite })),
  depth: finite.optional(),
  faces: z.number().int().optional(),
  halfAngle: finite.optional(),
  slantLength: finite.optional(),
  settings: z.number().int().optional(),
  blankDiameter: finite.optional(),
  overWires: finite.optional(),
  /** Thread left incomplete at a shoulder without relief (mm). */
  runOut: finite.optional(),
  reasons: z.array(z.string()),
  /** How it is done, in words. */
  notes: z.array(z.string()).optional(),
  cautions: z.array(z.string()),
  check: z.string(),
});

const setup = z.object({
  id: z.string(),
  machine: z.string(),
  holding: z.string(),
  gripFrom: finite,
  gripTo: finite,
  freeEnd: end,
  support: z.enum(['centre', 'steady', 'outboard']).optional(),
  /** Where three jaws close on the faces of a polygon instead of a round. */
  heldOn: z.literal('flats').optional(),
});

const route = z.object({
  stock: z.object({
    shape: z.enum(['round', 'hex', 'square']),
    size: finite,
    material: z.string(),
    bar: z.string().optional(),
  }),
  blankLength: finite,
  setups: z.array(setup),
  operations: z.array(operation),
  volumes: z.object({ blank: finite, removed: finite, kerf: finite, remnant: finite, part: finite }),
  minutes: z.object({ setup: finite, run: finite }),
  cost: z.looseObject({ one: finite, total: finite, currency: z.string() }).optional(),
});

export const capacity = z.object({
  verdict: z.enum(['can', 'cannot', 'with-changes']),
  needs: z.array(
    z.object({
      operation: z.number().int().nonnegative(),
      need: z.string(),
      state: z.enum(['held', 'short', 'alternative']),
      why: z.string(),
      alternatives: z.array(z.string()),
    }),
  ),
});

export const drawResult = z.object({
  schemaVersion: z.literal(1),
  template: z.string(),
  templateHash: z.string(),
  engine: z.string(),
  parameters: z.record(z.string(), z.unknown()),
  part: z.object({
    length: finite,
    maxDiameter: finite,
    volume: finite,
    mass: finite,
    density: finite,
    material: z.string(),
    stations: z.array(z.object({ id: z.string(), x: finite })),
    features: z.array(feature),
  }),
  sizes: z.array(size),
  completeness: z.object({ missing: z.array(z.string()), redundant: z.array(z.string()) }),
  check: z.array(z.object({ rule: z.string(), message: z.string(), entities: z.array(z.string()) })),
  sheet: z.object({
    size: z.enum(['A4', 'A3', 'A2', 'A1', 'A', 'B', 'C', 'D']),
    scale: finite,
    style: z.enum(['iso', 'asme']),
    unit: z.enum(['mm', 'in']),
    views: z.array(z.string()),
  }),
  /** Null only when no plan exists at all; `capacity` then says why. */
  route: route.nullable(),
  capacity,
});
export type DrawResult = z.infer<typeof drawResult>;
