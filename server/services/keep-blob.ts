import type { ShopWork } from './shop-work';

/** Keeps bytes in the store and notes that they are this shop's; gives their hash. */
export async function keepBlob(work: ShopWork, bytes: Uint8Array, mediaType: string): Promise<string> {
  const hash = await work.services.store.put(bytes);
  await work.services.database.sequelize.query(
    `INSERT INTO blobs (shop_id, hash, media_type, size) VALUES ($1, $2, $3, $4) ON CONFLICT DO NOTHING`,
    { bind: [work.shop.id, hash, mediaType, bytes.byteLength], transaction: work.t },
  );
  return hash;
}
