import { z } from 'zod';
import type { Register } from './register';

/** Shape of a register that comes from outside (a file, the server): lengths mm, speeds rpm, feeds mm. */
const id = z.string().min(1).max(80);
const text = z.string().max(400);
const positive = z.number().positive().max(1e6);
const amount = z.number().nonnegative().max(1e6);
const item = { id, name: text, place: text };
const figures = (most: number) => z.array(positive).max(most);

const lathe = z.object({
  ...item,
  swing: positive,
  swingOverSlide: positive,
  betweenCentres: positive,
  spindleBore: positive,
  speeds: figures(200),
  feeds: figures(200),
  pitches: figures(200),
  threadsPerInch: figures(200),
  slideTravel: positive,
  slideGraduation: positive,
  tailTravel: positive,
  taperAttachment: z.boolean(),
  powerKw: positive,
  ratePerHour: amount,
});
const mill = z.object({
  ...item,
  speeds: figures(200),
  feedsPerMin: figures(200),
  travelX: positive,
  travelY: positive,
  travelZ: positive,
  ratePerHour: amount,
});
const saw = z.object({ ...item, kerf: positive, maximumDiameter: positive, ratePerHour: amount });
const chuck = z.object({
  ...item,
  kind: z.enum(['three-jaw', 'four-jaw']),
  minimum: amount,
  maximum: positive,
  jawLength: positive,
  machines: z.array(id).max(50),
  maximumSpeed: positive,
});
const colletSet = z.object({
  ...item,
  sizes: figures(400),
  range: amount,
  gripLength: positive,
  machines: z.array(id).max(50),
});
const colletBlock = z.object({ ...item, faces: z.union([z.literal(4), z.literal(6)]), colletSet: id });
const dividingHead = z.object({
  ...item,
  ratio: positive,
  plates: z.array(z.array(z.number().int().positive().max(1000)).max(60)).max(20),
  minimum: amount,
  maximum: positive,
});
const tool = z.object({
  ...item,
  kind: z.enum([
    'turning', 'facing', 'chamfering', 'parting', 'form', 'threading', 'boring', 'die', 'die-holder', 'tap', 'drill', 'reamer',
    'centre-drill', 'knurl', 'end-mill', 'tail-centre', 'steady', 'threaded-bush', 'file', 'scriber',
  ]), // prettier-ignore
  material: z.enum(['hss', 'carbide', 'other']),
  figures: z.record(z.string().max(40), z.number()),
  designation: text.optional(),
  madeHere: z.boolean().optional(),
  caution: text.optional(),
});
const instrument = z.object({
  ...item,
  kind: z.enum([
    'rule', 'caliper', 'micrometer', 'depth', 'ring-gauge', 'plug-gauge', 'radius-gauge', 'dial', 'protractor', 'thread-wires',
  ]), // prettier-ignore
  minimum: amount,
  maximum: positive,
  permissibleError: amount,
  designation: text.optional(),
});
const bar = z.object({
  ...item,
  material: id,
  certified: z.boolean(),
  certificate: text.optional(),
  shape: z.enum(['round', 'hex', 'square']),
  size: positive,
  length: positive,
  quantity: z.number().int().nonnegative().max(100_000),
  costPerMetre: amount,
});

export const registerSchema: z.ZodType<Register> = z.object({
  schemaVersion: z.literal(1),
  lathes: z.array(lathe).max(100),
  mills: z.array(mill).max(100),
  saws: z.array(saw).max(100),
  chucks: z.array(chuck).max(200),
  colletSets: z.array(colletSet).max(200),
  colletBlocks: z.array(colletBlock).max(200),
  dividingHeads: z.array(dividingHead).max(100),
  tools: z.array(tool).max(5000),
  instruments: z.array(instrument).max(5000),
  bars: z.array(bar).max(10_000),
  settings: z.object({
    currency: z.string().min(1).max(8),
    labourPerHour: amount,
    instrumentRatio: z.number().positive().max(1),
    dieLimit: amount,
    surfaceTexture: text,
  }),
});
