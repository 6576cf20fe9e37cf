/**
 * Characters an sfnt face has a glyph for, as code points, read from its `cmap` (formats 4 and 12, which hold Unicode).
 * Source: ISO/IEC 14496-22 (Open Font Format), "cmap". @throws Error when the face has no such table.
 */
export function charactersOf(sfnt: Buffer): ReadonlySet<number> {
  const table = tableOf(sfnt, 'cmap');
  const codes = new Set<number>();
  for (let index = 0; index < table.readUInt16BE(2); index += 1) {
    const map = table.subarray(table.readUInt32BE(8 + index * 8));
    const format = map.readUInt16BE(0);
    if (format === 4) addSegments(map, codes);
    if (format === 12) addGroups(map, codes);
  }
  if (codes.size === 0) throw new Error('This face maps no Unicode characters.');
  return codes;
}

function tableOf(sfnt: Buffer, tag: string): Buffer {
  for (let index = 0; index < sfnt.readUInt16BE(4); index += 1) {
    const entry = 12 + index * 16;
    if (sfnt.toString('latin1', entry, entry + 4) !== tag) continue;
    const offset = sfnt.readUInt32BE(entry + 8);
    return sfnt.subarray(offset, offset + sfnt.readUInt32BE(entry + 12));
  }
  throw new Error(`This face has no table ${tag}.`);
}

/** Format 4: segments of 16-bit codes, each with a shift or a place in a list of glyphs; glyph 0 is none. */
function addSegments(map: Buffer, codes: Set<number>): void {
  const doubled = map.readUInt16BE(6);
  const [ends, starts, shifts, places] = [14, 16 + doubled, 16 + 2 * doubled, 16 + 3 * doubled];
  for (let at = 0; at < doubled; at += 2) {
    const [first, last] = [map.readUInt16BE(starts + at), map.readUInt16BE(ends + at)];
    const [shift, place] = [map.readUInt16BE(shifts + at), map.readUInt16BE(places + at)];
    for (let code = first; code <= last && code !== 0xffff; code += 1) {
      const listed = place === 0 ? code : map.readUInt16BE(places + at + place + 2 * (code - first));
      if (place !== 0 && listed === 0) continue;
      if (((listed + shift) & 0xffff) !== 0) codes.add(code);
    }
  }
}

/** Format 12: groups of codes with consecutive glyphs. */
function addGroups(map: Buffer, codes: Set<number>): void {
  for (let group = 0; group < map.readUInt32BE(12); group += 1) {
    const at = 16 + group * 12;
    for (let code = map.readUInt32BE(at); code <= map.readUInt32BE(at + 4); code += 1) codes.add(code);
  }
}
