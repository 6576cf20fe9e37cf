import { renderSvg } from '../../shared/render/svg';
import { Refusal } from '../errors';
import { routeCard } from '../pdf/route-card/route-card';
import { printedDate } from './printed-date';
import { readRevision } from './read-revision';
import { recordAudit } from './record';
import type { RevisionAt, RevisionPlace } from './revision-at';
import type { ShopWork } from './shop-work';
import { sheetSvg } from './sheet-svg';
import { stampAcross, stateWord } from '../../shared/state-words';

/** The sheet of a revision as SVG, and a name for its file. @throws Refusal `not-drawn` while there is none. */
export async function readSheetSvg(
  work: ShopWork,
  place: RevisionPlace,
): Promise<{ svg: string; name: string }> {
  const at = await readRevision(work, place);
  return { svg: await svgOf(work, at), name: fileName(at) };
}

/** The sheet as PDF, alone or with its route card; the sheet alone of a release is the very bytes kept then. */
export async function printRevision(
  work: ShopWork,
  place: RevisionPlace,
  options: { card: boolean },
): Promise<{ pdf: Uint8Array; name: string }> {
  const at = await readRevision(work, place);
  const pdf = await pdfOf(work, at, options.card);
  await recordAudit(work, 'printed', {
    drawingId: at.drawing.id,
    revisionId: at.revision.id,
    detail: { letter: at.revision.letter, state: at.revision.state, card: options.card },
  });
  return { pdf, name: fileName(at) };
}

async function pdfOf(work: ShopWork, at: RevisionAt, card: boolean): Promise<Uint8Array> {
  const { revision, drawing } = at;
  if (revision.state === 'released' && revision.pdfHash && !card) {
    const kept = await work.services.store.get(revision.pdfHash);
    if (!kept) throw new Error(`The released PDF ${revision.pdfHash} is not in the store.`);
    return kept;
  }
  const pages = [await svgOf(work, at)];
  if (card && revision.route && revision.scheme && revision.sheet) {
    const cards = routeCard(revision.route, revision.scheme, {
      number: drawing.number,
      letter: revision.letter,
      title: revision.title,
      state: stateText(work, at),
      stamp: stampAcross(revision),
      entryUnit: revision.entryUnit,
      format: {
        unit: revision.settings.unit,
        style: revision.settings.style,
        decimalSign: revision.sheet.decimalSign,
      },
      register: (await registerOf(work, revision.registerId)).content,
    });
    pages.push(...cards.map(renderSvg));
  }
  return work.services.pdf(pages, {
    title: `${drawing.number} ${revision.letter} ${revision.title}`,
    date: revision.changedAt,
  });
}

function stateText(work: ShopWork, { revision }: RevisionAt): string {
  const word = stateWord(revision);
  const day = printedDate(revision.checkedAt ?? revision.changedAt, work.shop.timeZone);
  return `${word} ${day}`;
}

async function registerOf(work: ShopWork, id: string) {
  const register = await work.services.database.models.registers.findOne({
    where: { shopId: work.shop.id, id },
    transaction: work.t,
  });
  if (!register) throw new Error(`There is no register ${id}.`);
  return register;
}

async function svgOf(work: ShopWork, { revision }: RevisionAt): Promise<string> {
  if (!revision.sheet) throw new Refusal('not-drawn');
  return sheetSvg(work, revision, revision.sheet);
}

function fileName({ drawing, revision }: RevisionAt): string {
  return `${drawing.number}-${revision.letter}`;
}
