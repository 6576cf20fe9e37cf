import { inflateSync } from 'node:zlib';

const WOFF_HEADER = 44;
const WOFF_ENTRY = 20;
const SFNT_HEADER = 12;
const SFNT_ENTRY = 16;

interface Table {
  tag: number;
  checksum: number;
  bytes: Buffer;
}

/**
 * A WOFF 1.0 face as the sfnt (TrueType or OpenType) inside it. The PDF writer reads sfnt directly; unpacking once
 * spares it on every page. Tables named in `without` are left out. Source: W3C Recommendation "WOFF File Format 1.0". @throws Error when the bytes are no WOFF.
 */
export function unpackWoff(woff: Buffer, without: readonly string[] = []): Buffer {
  if (woff.length < WOFF_HEADER || woff.toString('latin1', 0, 4) !== 'wOFF')
    throw new Error('These bytes are no WOFF 1.0 face.');
  const left = new Set(without.map((tag) => Buffer.from(tag, 'latin1').readUInt32BE(0)));
  return packSfnt(
    woff.readUInt32BE(4),
    readTables(woff).filter((table) => !left.has(table.tag)),
  );
}

function readTables(woff: Buffer): Table[] {
  const count = woff.readUInt16BE(12);
  return Array.from({ length: count }, (_, index) => {
    const entry = WOFF_HEADER + index * WOFF_ENTRY;
    const offset = woff.readUInt32BE(entry + 4);
    const packedLength = woff.readUInt32BE(entry + 8);
    const length = woff.readUInt32BE(entry + 12);
    const packed = woff.subarray(offset, offset + packedLength);
    const bytes = packedLength < length ? inflateSync(packed) : packed;
    if (bytes.length !== length) throw new Error('A table of the WOFF face is damaged.');
    return { tag: woff.readUInt32BE(entry), checksum: woff.readUInt32BE(entry + 16), bytes };
  });
}

/** Tables stay in the order of their tags, as WOFF demands of its directory too; each begins on a multiple of four. */
function packSfnt(flavour: number, tables: readonly Table[]): Buffer {
  const head = Buffer.alloc(SFNT_HEADER + tables.length * SFNT_ENTRY);
  const power = Math.floor(Math.log2(tables.length));
  head.writeUInt32BE(flavour, 0);
  head.writeUInt16BE(tables.length, 4);
  head.writeUInt16BE(2 ** power * 16, 6);
  head.writeUInt16BE(power, 8);
  head.writeUInt16BE(tables.length * 16 - 2 ** power * 16, 10);
  const parts: Buffer[] = [head];
  let offset = head.length;
  tables.forEach(({ tag, checksum, bytes }, index) => {
    const entry = SFNT_HEADER + index * SFNT_ENTRY;
    head.writeUInt32BE(tag, entry);
    head.writeUInt32BE(checksum, entry + 4);
    head.writeUInt32BE(offset, entry + 8);
    head.writeUInt32BE(bytes.length, entry + 12);
    const padding = Buffer.alloc((4 - (bytes.length % 4)) % 4);
    parts.push(bytes, padding);
    offset += bytes.length + padding.length;
  });
  return Buffer.concat(parts);
}
