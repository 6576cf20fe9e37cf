import { mkdtemp, readdir, rm, writeFile } from 'node:fs/promises';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { describe, expect, it } from 'vitest';
import { face } from '../../../server/pdf/faces';
import { unpackWoff } from '../../../server/pdf/woff';
import { canonicalJson, contentHash } from '../../../server/services/content-hash';
import { revisionLetter } from '../../../server/services/revision-letter';
import { stampAcross, stateWord } from '../../../shared/state-words';
import { localDiskStore } from '../../../server/storage/local-disk';

describe('letters of revisions', () => {
  it('leave out I and O, and go on after Z', () => {
    const letters = Array.from({ length: 26 }, (_, index) => revisionLetter(index + 1));
    expect(letters.join(' ')).toBe('A B C D E F G H J K L M N P Q R S T U V W X Y Z AA AB');
    expect(revisionLetter(24 + 24 * 24 + 1)).toBe('AAA');
  });
});

describe('the hash that a checker approves', () => {
  const content = {
    values: { b: 1, a: [{ y: 0.1, x: null }] },
    part: { length: 1e-7 },
    scheme: {},
    route: null,
  };

  it('does not depend on the order of keys, nor on a way through the database', () => {
    const turned = {
      route: null,
      scheme: {},
      part: { length: 1e-7 },
      values: { a: [{ x: null, y: 0.1 }], b: 1 },
    };
    expect(contentHash(turned)).toBe(contentHash(content));
    expect(contentHash(JSON.parse(canonicalJson(content)) as typeof content)).toBe(contentHash(content));
  });

  it('changes with every value, part, scheme and route, and with the order of a list', () => {
    const others = [
      { ...content, values: { ...content.values, b: 2 } },
      { ...content, part: { length: 2e-7 } },
      { ...content, scheme: { sizes: [] } },
      { ...content, route: [] },
      { ...content, values: { b: 1, a: [null] } },
    ];
    const hashes = [content, ...others].map(contentHash);
    expect(new Set(hashes).size).toBe(hashes.length);
    for (const hash of hashes) expect(hash).toMatch(/^[0-9a-f]{64}$/);
  });
});

describe('words of a state', () => {
  it('are printed in the block, and across every sheet that must not be worked from', () => {
    const draft = { state: 'draft', trial: false, returned: false } as const;
    expect(stateWord(draft)).toBe('DRAFT');
    expect(stateWord({ ...draft, returned: true })).toBe('RETURNED');
    expect(stampAcross({ ...draft, trial: true })).toBe('TRIAL PIECE ONLY');
    expect(stampAcross({ ...draft, state: 'in review' })).toBe('IN REVIEW: not for manufacture');
    expect(stampAcross({ ...draft, state: 'released' })).toBeUndefined();
    expect(stampAcross({ ...draft, state: 'withdrawn' })).toMatch(/^WITHDRAWN/);
  });
});

describe('the store on disk', () => {
  it('keeps the same bytes once, gives them back, and notices when they were changed', async () => {
    const folder = await mkdtemp(join(tmpdir(), 'benchleaf-store-'));
    try {
      const store = localDiskStore(folder);
      const [hash, again] = await Promise.all([
        store.put(Buffer.from('a sheet')),
        store.put(Buffer.from('a sheet')),
      ]);
      expect(again).toBe(hash);
      const place = join(folder, hash.slice(0, 2));
      expect(await readdir(place)).toEqual([hash.slice(2)]);
      expect((await store.get(hash))?.toString()).toBe('a sheet');
      expect(await store.get('0'.repeat(64))).toBeNull();
      await expect(store.get('../../etc/passwd')).rejects.toThrow(/no name of the store/);
      await writeFile(join(place, hash.slice(2)), 'another sheet');
      await expect(store.get(hash)).rejects.toThrow(/damaged/);
    } finally {
      await rm(folder, { recursive: true, force: true });
    }
  });
});

describe('the lettering', () => {
  it('is unpacked to a face without ligatures, and nothing else is taken for one', () => {
    for (const sfnt of [face('latin', 400), face('latin', 700)]) {
      const tags = Array.from({ length: sfnt.readUInt16BE(4) }, (_, index) =>
        sfnt.toString('latin1', 12 + index * 16, 16 + index * 16),
      );
      expect(tags).toContain('cmap');
      expect(tags).not.toContain('GSUB');
      expect(tags).toEqual([...tags].sort());
    }
    expect(() =>
      unpackWoff(Buffer.from('wOF2 and some more bytes than a head has, to be sure of it')),
    ).toThrow(/no WOFF/);
  });
});
