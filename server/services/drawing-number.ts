import { QueryTypes } from 'sequelize';
import type { ShopWork } from './shop-work';

const SERIES = 'PN';

/**
 * The shop's next drawing number, `PN-0001` onwards. The row of the series stays locked until the transaction that
 * makes the drawing ends, so numbers have neither gaps nor races.
 */
export async function nextDrawingNumber(work: ShopWork): Promise<string> {
  const [row] = await work.services.database.sequelize.query<{ last: number }>(
    `INSERT INTO number_series (shop_id, series, last) VALUES ($1, $2, 1)
     ON CONFLICT (shop_id, series) DO UPDATE SET last = number_series.last + 1 RETURNING last`,
    { bind: [work.shop.id, SERIES], transaction: work.t, type: QueryTypes.SELECT },
  );
  if (!row) throw new Error('The number series gave no number.');
  return `${SERIES}-${String(row.last).padStart(4, '0')}`;
}
