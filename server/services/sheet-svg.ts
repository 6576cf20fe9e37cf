import type { Group, Sheet } from '../../shared/drawing/sheet';
import { renderSvg } from '../../shared/render/svg';
import type { Revision } from '../models/revision';
import type { ShopWork } from './shop-work';
import { stampAcross } from '../../shared/state-words';

/**
 * The sheet as SVG: a released one is the very bytes that were kept at its release; one that no longer holds is drawn
 * from the stored sheet with the word across it; a draft from its stored sheet.
 */
export async function sheetSvg(work: ShopWork, revision: Revision, sheet: Sheet): Promise<string> {
  if (revision.state === 'released' && revision.svgHash) {
    const kept = await work.services.store.get(revision.svgHash);
    if (!kept) throw new Error(`The released sheet ${revision.svgHash} is not in the store.`);
    return kept.toString('utf8');
  }
  return renderSvg(nowStamped(revision, sheet));
}

/** A sheet that was released carries no stamp of its own; once it no longer holds, the word is laid across it. */
export function nowStamped(revision: Revision, sheet: Sheet): Sheet {
  if (revision.state !== 'superseded' && revision.state !== 'withdrawn') return sheet;
  const words = stampAcross(revision) ?? '';
  const [x0, y0, x1, y1] = sheet.frame;
  // A glyph is 0.6 em wide; the words take four fifths of the frame.
  const size = Math.min(24, ((x1 - x0) * 0.8) / (0.6 * words.length));
  const stamp: Group = {
    role: 'stamp',
    marks: [
      {
        type: 'text',
        x: (x0 + x1) / 2,
        y: (y0 + y1) / 2,
        size,
        anchor: 'middle',
        weight: 800,
        text: words,
        faint: true,
      },
    ],
  };
  return { ...sheet, groups: [...sheet.groups, stamp] };
}
