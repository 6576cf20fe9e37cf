import type { Body } from '../part/body';
import { applyRemoval } from '../part/apply';
import { mirrorBody, mirrorRemoval } from '../part/mirror';
import type { Removal } from '../part/removal';
import type { Lathe, Mill, Register, Saw } from './register';
import type { End, Method, NeedKind, SetUp, StockChoice } from './route';
import type { View } from './features';
import type { RuleId } from './rules';
import type { Words } from './words';

/** A plan that cannot be: thrown inside a candidate, caught where candidates are compared. */
export class RuledOut {
  /** Not an Error: it is thrown by the dozen for every part, and a stack for each costs more than the plan. */
  constructor(
    readonly rule: RuleId,
    readonly message: string,
  ) {}
}

/** What an operation asks of the shop, before it is put in words for the reader. */
export interface DraftNeed {
  kind: NeedKind;
  need: string;
  state: 'held' | 'short' | 'alternative';
  by?: string;
  why: string;
  alternatives: readonly string[];
}

/** How the figures of a cut come about: sizes in mm, as the method sees them. */
export interface CutFigures {
  /** Diameter that turns under the tool (or of the cutter, for a mill). */
  diameter: number;
  /** Travel of one pass. */
  travel: number;
  depth: number;
  passes: number;
}

export interface DraftOperation {
  key: string;
  method: Method;
  title: string;
  setup: string;
  end: End;
  features: readonly string[];
  machine: string;
  tool: string;
  toolItem?: string;
  toolMaterial: 'hss' | 'carbide';
  /** Noses and teeth, for feeds. */
  toolFigures: Readonly<Record<string, number>>;
  figures: CutFigures | null;
  /** Thread, for its pitch as feed. */
  pitch?: number;
  cut?: Removal;
  after: { key: string; rule: RuleId }[];
  stops: { from: string; fromX: number; toX: number }[];
  depth?: number;
  faces?: number;
  halfAngle?: number;
  slantLength?: number;
  settings?: number;
  runOut?: number;
  blank?: { diameter: number; upper: number; lower: number; thread: string };
  reasons: RuleId[];
  notes: string[];
  check: string;
  /** Minutes by hand beside the cutting. */
  handling: number;
  needs: DraftNeed[];
}

/** A set-up, and whether long work hangs on a short grip in it. */
export type DraftSetUp = SetUp & { rocks: boolean };

/** A plan while it is being made. Bodies are in the part's own x, whatever end is free. */
export interface Build {
  register: Register;
  /** How lengths are said in its sentences. */
  words: Words;
  lathe: Lathe;
  mill: Mill | null;
  saw: Saw | null;
  stock: StockChoice;
  stockRadius: number;
  views: { right: View; left: View };
  blank: Body;
  stage: Body;
  /** The stage turned end for end, kept while the stage stays the same. */
  turned?: { of: Body; body: Body };
  setups: DraftSetUp[];
  operations: DraftOperation[];
  planNeeds: DraftNeed[];
  notes: string[];
}

/** The stage with the free end of the view to the right. */
export function stageIn(build: Build, view: View): Body {
  if (!view.flipped) return build.stage;
  if (build.turned?.of !== build.stage)
    build.turned = { of: build.stage, body: mirrorBody(build.stage, view.length) };
  return build.turned.body;
}

export type OperationWish = Omit<
  DraftOperation,
  | 'setup'
  | 'end'
  | 'cut'
  | 'after'
  | 'stops'
  | 'reasons'
  | 'notes'
  | 'needs'
  | 'handling'
  | 'machine'
  | 'toolMaterial'
  | 'toolFigures'
> & {
  /** In the view's x. */
  cut?: Removal;
  after?: { key: string; rule: RuleId }[];
  /** In the view's x; a stop from the free face when `from` is absent. */
  stops?: { toX: number }[];
  reasons?: RuleId[];
  notes?: string[];
  needs?: DraftNeed[];
  handling?: number;
  machine?: string;
  toolMaterial?: 'hss' | 'carbide';
  toolFigures?: Readonly<Record<string, number>>;
};

/** Adds an operation to the newest set-up and takes its metal off the stage. */
export function addOperation(build: Build, view: View, wish: OperationWish): DraftOperation {
  const setup = build.setups[build.setups.length - 1];
  if (!setup) throw new Error('an operation needs a set-up');
  const length = view.length;
  const face = view.flipped ? build.stage.x0 : build.stage.x1;
  // Written out, not spread: dozens of these are made for every part while somebody types.
  const operation: DraftOperation = {
    key: wish.key,
    method: wish.method,
    title: wish.title,
    features: wish.features,
    tool: wish.tool,
    toolItem: wish.toolItem,
    figures: wish.figures,
    pitch: wish.pitch,
    depth: wish.depth,
    faces: wish.faces,
    halfAngle: wish.halfAngle,
    slantLength: wish.slantLength,
    settings: wish.settings,
    runOut: wish.runOut,
    blank: wish.blank,
    check: wish.check,
    setup: setup.id,
    end: wish.method === 'mill-flat' ? 'side' : view.flipped ? 'left' : 'right',
    machine: wish.machine ?? setup.machine,
    toolMaterial: wish.toolMaterial ?? 'hss',
    toolFigures: wish.toolFigures ?? {},
    cut: wish.cut && (view.flipped ? mirrorRemoval(wish.cut, length) : wish.cut),
    after: wish.after ?? [],
    stops: (wish.stops ?? []).map(({ toX }) => ({
      from: `${setup.id}.face`,
      fromX: face,
      toX: view.flipped ? length - toX : toX,
    })),
    reasons: wish.reasons ?? [],
    notes: wish.notes ?? [],
    needs: wish.needs ?? [],
    handling: wish.handling ?? 0.5,
  };
  if (operation.cut) build.stage = applyRemoval(build.stage, operation.cut);
  build.operations.push(operation);
  return operation;
}
