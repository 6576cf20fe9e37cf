/** Characters that a text takes: the drawn diameter sign is wider than a letter. */
export function charactersOf(text: string): number {
  return [...text].reduce((sum, letter) => sum + (letter === 'Ø' ? 2 : 1), 0);
}

/** What stands beside a × belongs to it: `1.5 × 45°`. */
const BETWEEN_WORDS = /(?<!×)\s+(?!×)/;

/** Text in lines of at most `characters`, broken between words; a longer word is broken where it must be. */
export function wrap(text: string, characters: number): string[] {
  const lines: string[] = [];
  let line = '';
  for (const word of text.split(BETWEEN_WORDS).filter((one) => one !== '')) {
    let rest = word;
    if (line !== '' && charactersOf(line) + 1 + charactersOf(rest) <= characters) {
      line += ` ${rest}`;
      continue;
    }
    if (line !== '') lines.push(line);
    while (charactersOf(rest) > characters) {
      lines.push(`${rest.slice(0, characters - 1)}-`);
      rest = rest.slice(characters - 1);
    }
    line = rest;
  }
  if (line !== '') lines.push(line);
  return lines;
}
