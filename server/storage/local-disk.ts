import { createHash, randomUUID } from 'node:crypto';
import { mkdir, readFile, rename, rm, stat, writeFile } from 'node:fs/promises';
import { join } from 'node:path';
import type { BlobStore } from './blob-store';

/** A store in a folder of this machine: `ab/cdef…`, each file moved into place whole. */
export function localDiskStore(folder: string): BlobStore {
  const placeOf = (hash: string) => join(folder, hash.slice(0, 2), hash.slice(2));
  return {
    async put(bytes) {
      const hash = createHash('sha256').update(bytes).digest('hex');
      const place = placeOf(hash);
      if (await exists(place)) return hash;
      await mkdir(join(folder, hash.slice(0, 2)), { recursive: true });
      const unfinished = `${place}.${randomUUID()}`;
      try {
        await writeFile(unfinished, bytes, { flag: 'wx' });
        await rename(unfinished, place);
      } catch (error) {
        await rm(unfinished, { force: true });
        throw error;
      }
      return hash;
    },
    async get(hash) {
      if (!/^[0-9a-f]{64}$/.test(hash)) throw new Error(`"${hash}" is no name of the store.`);
      let bytes: Buffer;
      try {
        bytes = await readFile(placeOf(hash));
      } catch (error) {
        if ((error as NodeJS.ErrnoException).code === 'ENOENT') return null;
        throw error;
      }
      const found = createHash('sha256').update(bytes).digest('hex');
      if (found !== hash) throw new Error(`The blob ${hash} is damaged: its bytes hash to ${found}.`);
      return bytes;
    },
  };
}

async function exists(place: string): Promise<boolean> {
  return stat(place).then(
    () => true,
    () => false,
  );
}
