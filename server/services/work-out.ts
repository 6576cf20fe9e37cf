import type { EngineResult } from '../../shared/engine';
import { ENGINE_VERSION } from '../../shared/engine';
import type { SheetSettings } from '../../shared/api/drawings';
import type { TitleBlock } from '../../shared/drawing/sheet';
import type { Register } from '../../shared/route/register';
import type { TypedValues } from '../../shared/template/template';
import { templateById } from '../../templates';
import { Refusal } from '../errors';
import type { Revision } from '../models/revision';
import { contentHash } from './content-hash';
import type { HistoryLine } from './revision-history';
import type { ShopWork } from './shop-work';

/** What is known about a revision before the engine is asked. */
export interface Filled {
  template: string;
  title: string;
  entryUnit: 'mm' | 'in';
  settings: SheetSettings;
  typed: TypedValues;
}

/** What the records print on the sheet. */
export interface Signed {
  number: string;
  letter: string;
  state: string;
  stamp: string | undefined;
  drawn: { by: string; date: string } | null;
  checked: TitleBlock['checked'];
  history: readonly HistoryLine[];
  frozenBalloons?: Readonly<Record<string, number>>;
}

/** Asks the engine, outside the transaction (see `engineBeside`). @throws Refusal at `template` when there is no such family. */
export async function workOut(
  work: ShopWork,
  filled: Filled,
  register: Register,
  signed: Signed,
): Promise<EngineResult> {
  const template = templateById(filled.template);
  if (!template) {
    throw new Refusal('bad-input', [
      { path: 'template', message: `There is no template named "${filled.template}".` },
    ]);
  }
  const titled = template.parameters.some((parameter) => parameter.id === 'title');
  return work.engine({
    template: filled.template,
    typed: titled ? { ...filled.typed, title: filled.title } : filled.typed,
    entryUnit: filled.entryUnit,
    unit: filled.settings.unit,
    style: filled.settings.style,
    sheet: filled.settings.sheet,
    scale: filled.settings.scale,
    balloons: filled.settings.balloons,
    register,
    titleBlock: {
      number: signed.number,
      revision: signed.letter,
      drawn: signed.drawn,
      checked: signed.checked,
      state: signed.state,
      owner: work.shop.name,
      revisions: signed.history,
    },
    stamp: signed.stamp,
    frozenBalloons: signed.frozenBalloons,
  });
}

type Snapshot = Pick<
  Revision,
  | 'templateHash'
  | 'engine'
  | 'evaluated'
  | 'problems'
  | 'part'
  | 'scheme'
  | 'route'
  | 'capacity'
  | 'faults'
  | 'sheet'
  | 'findings'
  | 'contentHash'
>;

/**
 * What is kept of a result. While a value is wrong the last good drawing stays (those columns are left out) and there
 * is no hash that anybody could approve.
 */
export function snapshotOf(
  result: EngineResult,
): Partial<Snapshot> & Pick<Snapshot, 'templateHash' | 'engine' | 'evaluated' | 'problems'> {
  const { evaluation, problems, good } = result;
  const judged = {
    templateHash: evaluation.templateHash,
    engine: ENGINE_VERSION,
    evaluated: evaluation.parameters,
    problems,
  };
  if (!good) return { ...judged, contentHash: null };
  const { part, scheme, route, capacity, faults, sheet, findings } = good;
  return {
    ...judged,
    part,
    scheme,
    route,
    capacity,
    faults,
    sheet,
    findings,
    contentHash: contentHash({ values: evaluation.parameters, part, scheme, route }),
  };
}
