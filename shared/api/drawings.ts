import { z } from 'zod';
import { limits } from './limits';

export const lengthUnit = z.enum(['mm', 'in']);
export const draftingStyle = z.enum(['iso', 'asme']);
export const sheetChoice = z.enum(['auto', 'A4', 'A3', 'A2', 'A1', 'A', 'B', 'C', 'D']);
export const revisionStates = ['draft', 'in review', 'released', 'superseded', 'withdrawn'] as const;
export const revisionState = z.enum(revisionStates);
export type RevisionState = z.infer<typeof revisionState>;

const typedRow = z
  .record(z.string().max(60), z.string().max(limits.valueLength))
  .and(z.object({ key: z.string().min(1).max(40) }));
/** Values as typed: text, or the rows of a table with their hidden keys. */
export const typedValues = z
  .record(
    z.string().max(60),
    z.union([z.string().max(limits.valueLength), z.array(typedRow).max(limits.tableRows)]),
  )
  .refine((values) => Object.keys(values).length <= limits.parameters, 'Too many values.');

export const sheetSettings = z.object({
  unit: lengthUnit,
  style: draftingStyle,
  sheet: sheetChoice,
  /** `auto` or paper per real: 0.5 is 1:2. */
  scale: z.union([z.literal('auto'), z.number().positive().max(100)]),
  balloons: z.boolean(),
});
export type SheetSettings = z.infer<typeof sheetSettings>;

/** POST /api/shops/:shop/drawings. `id` may be made by the client (UUIDv7). */
export const startDrawingRequest = z.object({
  id: z.uuid().optional(),
  template: z.string().max(60),
  title: z.string().trim().min(1).max(limits.titleLength),
  note: z.string().max(limits.noteLength).default(''),
  entryUnit: lengthUnit,
  settings: sheetSettings,
  values: typedValues,
});
export type StartDrawingRequest = z.input<typeof startDrawingRequest>;

/** PUT /api/shops/:shop/drawings/:drawing/revisions/:revision. A draft keeps wrong values too; nothing typed is lost. */
export const saveRevisionRequest = z.object({
  version: z.number().int().nonnegative(),
  title: z.string().trim().min(1).max(limits.titleLength),
  note: z.string().max(limits.noteLength),
  entryUnit: lengthUnit,
  settings: sheetSettings,
  values: typedValues,
  /** What this revision changes, as the sheet's revision table prints it; left out, it stays as it is. */
  change: z.string().trim().min(1).max(limits.titleLength).optional(),
});
export type SaveRevisionRequest = z.infer<typeof saveRevisionRequest>;

/** POST /api/shops/:shop/drawings/:drawing/revisions. */
export const startRevisionRequest = z.object({
  change: z.string().trim().min(1).max(limits.titleLength).default('changed'),
});
export type StartRevisionRequest = z.input<typeof startRevisionRequest>;

/** POST …/submit and …/take-back. */
export const versionRequest = z.object({ version: z.number().int().nonnegative() });
/** POST …/approve: the hash is what the checker saw. */
export const approveRequest = versionRequest.extend({ contentHash: z.string().length(64) });
/** POST …/return and …/withdraw. */
export const reasonRequest = versionRequest.extend({
  reason: z.string().trim().min(limits.reasonLength.minimum).max(limits.reasonLength.maximum),
});
/** POST …/trial */
export const trialRequest = versionRequest.extend({ trial: z.boolean() });

const personAt = z.object({ name: z.string(), at: z.string() });

export const revisionSummary = z.object({
  id: z.uuid(),
  letter: z.string(),
  state: revisionState,
  trial: z.boolean(),
  /** A draft that came back. */
  returned: z.boolean(),
  version: z.number().int(),
  changedAt: z.string(),
  change: z.string(),
});
export type RevisionSummary = z.infer<typeof revisionSummary>;

/** What the signed-in person may do now with this record; the client shows no act that is false. */
export const abilities = z.record(z.string(), z.boolean());
export type Abilities = z.infer<typeof abilities>;

export const decision = z.object({
  act: z.enum([
    'started',
    'submitted',
    'taken back',
    'returned',
    'approved',
    'superseded',
    'withdrawn',
    'trial on',
    'trial off',
  ]),
  by: z.string(),
  at: z.string(),
  reason: z.string().nullable(),
  contentHash: z.string().nullable(),
});

/** Stored engine output; its inner shapes are the engine's own types (see shared/engine). */
export const storedResult = z.object({
  schemaVersion: z.literal(1),
  part: z.unknown(),
  scheme: z.unknown(),
  sheet: z.unknown(),
  findings: z.array(z.unknown()),
  route: z.unknown(),
  capacity: z.unknown(),
  faults: z.array(z.unknown()),
  svg: z.string(),
});

export const revisionAnswer = z.object({
  revision: revisionSummary.extend({
    drawing: z.object({ id: z.uuid(), number: z.string(), title: z.string() }),
    title: z.string(),
    note: z.string(),
    template: z.string(),
    templateHash: z.string(),
    engine: z.string(),
    entryUnit: lengthUnit,
    settings: sheetSettings,
    values: typedValues,
    contentHash: z.string().nullable(),
    problems: z.array(z.object({ path: z.string(), message: z.string() })),
    drawn: personAt.nullable(),
    checked: personAt.nullable(),
    noSecondCheck: z.boolean(),
    saved: personAt,
    decisions: z.array(decision),
    /** Earlier released revisions for the sheet's revision table. */
    history: z.array(z.object({ letter: z.string(), change: z.string(), by: z.string(), date: z.string() })),
    /** Balloons of the newest earlier release by size id, which unchanged sizes keep; null before any release. */
    frozenBalloons: z.record(z.string(), z.number().int()).nullable(),
    /** Last good evaluation; null when a draft has never been good. Shown as stored unless the revision is a draft. */
    result: storedResult.nullable(),
  }),
  abilities,
});
export type RevisionAnswer = z.infer<typeof revisionAnswer>;

/** GET /api/shops/:shop/drawings/:drawing */
export const drawingAnswer = z.object({
  drawing: z.object({ id: z.uuid(), number: z.string(), title: z.string(), template: z.string() }),
  /** Newest first. */
  revisions: z.array(revisionSummary),
  abilities,
});
export type DrawingAnswer = z.infer<typeof drawingAnswer>;

/** GET /api/shops/:shop/drawings?… All optional; ranges in mm. */
export const searchQuery = z.object({
  words: z.string().trim().max(limits.searchLength).optional(),
  thread: z.string().trim().max(60).optional(),
  material: z.string().max(60).optional(),
  lengthFrom: z.coerce.number().nonnegative().finite().optional(),
  lengthTo: z.coerce.number().nonnegative().finite().optional(),
  diameterFrom: z.coerce.number().nonnegative().finite().optional(),
  diameterTo: z.coerce.number().nonnegative().finite().optional(),
  /** Comma separated. */
  state: z.string().max(80).optional(),
  template: z.string().max(60).optional(),
  cursor: z.string().max(200).optional(),
  limit: z.coerce.number().int().min(1).max(limits.pageRows.maximum).default(limits.pageRows.fallback),
});
export type SearchQuery = z.input<typeof searchQuery>;

export const drawingRow = z.object({
  id: z.uuid(),
  number: z.string(),
  title: z.string(),
  template: z.string(),
  revision: revisionSummary,
  maxDiameter: z.number().nullable(),
  length: z.number().nullable(),
  threads: z.array(z.string()),
  material: z.string().nullable(),
  operations: z.number().int().nullable(),
  verdict: z.enum(['can', 'cannot', 'with-changes']).nullable(),
  /** SVG of the last set-up card's pair, drawn by the engine on save. */
  picture: z.string().nullable(),
});
export type DrawingRow = z.infer<typeof drawingRow>;

export const searchAnswer = z.object({
  drawings: z.array(drawingRow),
  total: z.number().int(),
  next: z.string().nullable(),
  abilities,
});
export type SearchAnswer = z.infer<typeof searchAnswer>;
