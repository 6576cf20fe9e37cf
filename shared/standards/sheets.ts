// Drawing sheets, landscape, trimmed, mm. ISO 5457 sizes and borders: standard. ASME Y14.1 sizes: standard; its margins: from memory.
import { inchesToMm } from '../units/length';
import type { Source } from './certainty';

export type SheetSizeId = 'A4' | 'A3' | 'A2' | 'A1' | 'A' | 'B' | 'C' | 'D';

export interface SheetSize {
  id: SheetSizeId;
  width: number;
  height: number;
  /** Distance of the frame from each trimmed edge. */
  margins: { left: number; right: number; top: number; bottom: number };
  basis: Source;
}

const ISO: Source = { source: 'ISO 5457', certainty: 'standard' };
const ASME: Source = { source: 'ASME Y14.1, margins from memory', certainty: 'from memory' };

function isoSheet(id: SheetSizeId, width: number, height: number): SheetSize {
  return { id, width, height, margins: { left: 20, right: 10, top: 10, bottom: 10 }, basis: ISO };
}

/** Margins in inches: across the width (left and right) and across the height (top and bottom). */
function inchSheet(id: SheetSizeId, width: number, height: number, sides: number, ends: number): SheetSize {
  return {
    id,
    width: inchesToMm(width),
    height: inchesToMm(height),
    margins: {
      left: inchesToMm(sides),
      right: inchesToMm(sides),
      top: inchesToMm(ends),
      bottom: inchesToMm(ends),
    },
    basis: ASME,
  };
}

export const SHEET_SIZES: Readonly<Record<SheetSizeId, SheetSize>> = {
  A4: isoSheet('A4', 297, 210),
  A3: isoSheet('A3', 420, 297),
  A2: isoSheet('A2', 594, 420),
  A1: isoSheet('A1', 841, 594),
  A: inchSheet('A', 11, 8.5, 0.25, 0.38),
  B: inchSheet('B', 17, 11, 0.62, 0.38),
  C: inchSheet('C', 22, 17, 0.5, 0.75),
  D: inchSheet('D', 34, 22, 1, 0.5),
};

/** Smallest first: the order in which a sheet is chosen. */
export const ISO_SHEETS: readonly SheetSizeId[] = ['A4', 'A3', 'A2', 'A1'];
export const INCH_SHEETS: readonly SheetSizeId[] = ['A', 'B', 'C', 'D'];

/** The frame's own rectangle on the sheet, y down from the top edge. */
export function frameOf(sheet: SheetSize): { x: number; y: number; width: number; height: number } {
  const { left, right, top, bottom } = sheet.margins;
  return { x: left, y: top, width: sheet.width - left - right, height: sheet.height - top - bottom };
}
