import type { DrawingRow, SearchAnswer } from '../../shared/api/drawings';
import { shopAbilities } from '../policies/abilities';
import type { FoundRow } from '../services/search-drawings';
import type { ShopWork } from '../services/shop-work';
import { presentSummary } from './revision-summary';

export function presentSearch(
  work: ShopWork,
  found: { rows: readonly FoundRow[]; total: number; next: string | null },
): SearchAnswer {
  return {
    drawings: found.rows.map(presentRow),
    total: found.total,
    next: found.next,
    abilities: shopAbilities(work.asker),
  };
}

function presentRow(row: FoundRow): DrawingRow {
  const { number, title, template, maxDiameter, length, threads, material, operations, verdict, picture } =
    row;
  return {
    id: row.drawingId,
    ...{ number, title, template, maxDiameter, length, threads, material, operations, verdict, picture },
    revision: presentSummary({ ...row, id: row.revisionId }),
  };
}
