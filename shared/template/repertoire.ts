/**
 * Characters the sheet's face (JetBrains Mono: Latin, Latin extended, Greek, Cyrillic) has a glyph one cell wide for.
 * Source: character maps of the face's own files, joined; combining marks and controls left out.
 */
const RANGES =
  '20-7e a0-ac ae-131 134-17f 18f 192 1a0-1a1 1af-1b0 1cd-1ce 1e6-1e7 1ea-1eb 1f4-1f5 1fc-1ff 218-21b 232-233 237 259 ' +
  '2b9-2ba 2bc 2c6-2c7 2c9 2da 2dc-2dd 2f3 2f7 374-375 37e 384-38a 38c 38e-3a1 3a3-3cf 3d7 401-40c 40e-44f 451-45c ' +
  '45e-45f 490-491 1e80-1e85 1e9e 1ef2-1ef9 2013-2014 2018-201a 201c-201e 2020 2022 2026 2032-2033 2039-203a 2044 ' +
  '20ab-20ac 20ae 20bd 20bf 2113 2116 2122 2191 2193 2212 2215';

const REPERTOIRE: ReadonlySet<number> = new Set(
  RANGES.split(' ').flatMap((range) => {
    const [first = 0, last = first] = range.split('-').map((code) => Number.parseInt(code, 16));
    return Array.from({ length: last - first + 1 }, (_, offset) => first + offset);
  }),
);

export function isInRepertoire(character: string): boolean {
  return REPERTOIRE.has(character.codePointAt(0) ?? 0);
}

function isControl(code: number): boolean {
  return code < 0x20 || (code >= 0x7f && code < 0xa0) || code === 0xad || (code >= 0xd800 && code <= 0xdfff);
}

/** What stands in the way of printing a text, in words; undefined when it can be drawn as typed. */
export function refuseCharacters(text: string): string | undefined {
  for (const character of text) {
    const code = character.codePointAt(0) ?? 0;
    const name = `U+${code.toString(16).toUpperCase().padStart(4, '0')}`;
    if (isControl(code)) {
      return `The text holds a control character (${name}), which cannot be printed. Type it again on one line.`;
    }
    if (!REPERTOIRE.has(code)) {
      return `“${character}” (${name}) is not among the characters the sheet can print. Use Latin, Greek or Cyrillic letters, digits and common signs.`;
    }
  }
  return undefined;
}
