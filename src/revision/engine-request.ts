import type { RevisionAnswer } from '../../shared/api/drawings';
import type { EngineRequest, EngineTitleBlock } from '../../shared/engine';
import type { Register } from '../../shared/route/register';
import { stampAcross, stateWord } from '../../shared/state-words';
import type { Draft } from './draft';

/** What the sheet prints of the record, as plain data: the same facts draw the same sheet. */
export interface SheetFacts {
  template: string;
  titleBlock: EngineTitleBlock;
  stamp?: string;
  frozenBalloons?: Readonly<Record<string, number>>;
}

export function sheetFacts(
  { revision }: RevisionAnswer,
  shop: { name: string; timeZone: string },
): SheetFacts {
  return {
    template: revision.template,
    titleBlock: {
      number: revision.drawing.number,
      revision: revision.letter,
      drawn: { by: revision.saved.name, date: dateIn(revision.saved.at, shop.timeZone) },
      checked: null,
      state: stateWord(revision),
      owner: shop.name,
      revisions: revision.history,
    },
    stamp: stampAcross(revision),
    ...(revision.frozenBalloons ? { frozenBalloons: revision.frozenBalloons } : {}),
  };
}

/** What the engine is asked for a draft as it is typed now. */
export function engineRequest(
  facts: SheetFacts,
  { values, entryUnit, settings }: Pick<Draft, 'values' | 'entryUnit' | 'settings'>,
  register: Register,
): EngineRequest {
  const { unit, style, sheet, scale, balloons } = settings;
  return { ...facts, typed: values, entryUnit, unit, style, sheet, scale, balloons, register };
}

/** `2026-06-02` in the shop's own time zone. */
function dateIn(iso: string, timeZone: string): string {
  return new Intl.DateTimeFormat('en-CA', {
    timeZone,
    year: 'numeric',
    month: '2-digit',
    day: '2-digit',
  }).format(new Date(iso));
}
