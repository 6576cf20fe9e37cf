/**
 * Text as the search sees it: lower case, without accents, designations in one form (`M16×1,5` is `m16x1.5`), each
 * word whole and in its parts (`pn-0001`, `pn`, `0001`). Nothing but letters, digits and `. / -` is left, so that no
 * text can be anything but words to the database.
 */
export function searchWords(text: string): string[] {
  const plain = normalised(text);
  const words = plain.match(/[\p{L}\p{N}][\p{L}\p{N}./-]*/gu) ?? [];
  const all = words.flatMap((word) => {
    const whole = word.replace(/[./-]+$/u, '');
    const parts = whole.split(/[./-]+/u).filter((part) => part !== '');
    return parts.length > 1 ? [whole, ...parts] : [whole];
  });
  return [...new Set(all.map((word) => word.slice(0, LONGEST)))];
}

/** The question as a `tsquery` that every word must answer, each as a beginning; null when there is no word in it. */
export function wordsQuery(text: string): string | null {
  const plain = normalised(text);
  const words = plain.match(/[\p{L}\p{N}][\p{L}\p{N}./-]*/gu) ?? [];
  const wholes = words.map((word) => word.replace(/[./-]+$/u, '').slice(0, LONGEST));
  if (wholes.length === 0) return null;
  return wholes.map((word) => `'${word}':*`).join(' & ');
}

/** A thread's designation, or part of one, in the form it is kept in: `M10×1,25 - 6g` is `m10x1.25-6g`. */
export function threadWords(text: string): string {
  return normalised(text)
    .replace(/\s*([x-])\s*/gu, '$1')
    .trim();
}

/** A lexeme of PostgreSQL may be 2046 bytes; nobody searches for more than this. */
const LONGEST = 100;

function normalised(text: string): string {
  return text
    .normalize('NFKD')
    .replace(/\p{M}/gu, '')
    .toLowerCase()
    .replace(/×/gu, 'x')
    .replace(/(\d),(\d)/gu, '$1.$2')
    .replace(/(\d)\s+x\s+(\d)/gu, '$1x$2');
}
