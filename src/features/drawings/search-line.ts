import type { SearchQuery } from '../../../shared/api/drawings';
import { parseLength, type LengthUnit } from '../../../shared/units/length';
import { parseThread } from '../../../shared/standards/threads';

/** What one part of the search line was read as. */
export interface ReadTerm {
  /** `words`, `thread`, `length`, `largest diameter`, `material`. */
  what: string;
  as: string;
}

export interface ReadLine {
  query: Pick<
    SearchQuery,
    'words' | 'thread' | 'material' | 'lengthFrom' | 'lengthTo' | 'diameterFrom' | 'diameterTo'
  >;
  read: readonly ReadTerm[];
  /** Sentences about what could not be read; the rest of the line still counts. */
  unread: readonly string[];
}

export interface KnownMaterial {
  id: string;
  name: string;
  alsoKnownAs: readonly string[];
}

const RANGE_WORDS: Readonly<Record<string, 'length' | 'diameter'>> = {
  length: 'length',
  long: 'length',
  diameter: 'diameter',
  dia: 'diameter',
};

/** A bare size finds what is within this much of it, mm: what somebody remembers or measures with a rule. */
const REMEMBERED_WITHIN = 0.5;

/**
 * Reads the one search line: words, `M10`, `3/8-16`, `length 150..200`, `diameter 25`, `material EN8`.
 * A bare figure of a range is in the shop's entry unit. Whatever is typed, it never throws.
 */
export function readSearchLine(
  line: string,
  entryUnit: LengthUnit,
  materials: readonly KnownMaterial[],
): ReadLine {
  const tokens = line.split(/\s+/).filter((token) => token !== '');
  const words: string[] = [];
  const read: ReadTerm[] = [];
  const unread: string[] = [];
  const query: ReadLine['query'] = {};

  for (let at = 0; at < tokens.length; at += 1) {
    const token = tokens[at] ?? '';
    const following = tokens[at + 1];
    const range = RANGE_WORDS[token.toLowerCase()];
    if (range && following !== undefined) {
      at += 1;
      const found = readRange(following, entryUnit);
      if (typeof found === 'string') unread.push(`${token} ${following}: ${found}`);
      else {
        if (range === 'length') [query.lengthFrom, query.lengthTo] = [found.from, found.to];
        else [query.diameterFrom, query.diameterTo] = [found.from, found.to];
        read.push({ what: range === 'length' ? 'length' : 'largest diameter', as: found.words });
      }
    } else if (token.toLowerCase() === 'material' && following !== undefined) {
      at += 1;
      const material = materialNamed(following, materials);
      if (material) {
        query.material = material.id;
        read.push({ what: 'material', as: material.name });
      } else unread.push(`material ${following}: no material of the table has that name.`);
    } else if (looksLikeThread(token) && parseThread(token).ok) {
      query.thread = token;
      read.push({ what: 'thread', as: `${token}, either end` });
    } else words.push(token);
  }
  if (words.length > 0) {
    query.words = words.join(' ');
    read.unshift({ what: words.length > 1 ? 'words' : 'word', as: words.join(', ') });
  }
  return { query, read, unread };
}

/** `M10`, `M10x1.25-6g`, `3/8-16`, `1/2-13UNC`, `#10-24`: not `M`, not `Mooring`, not `PN-0147`. */
function looksLikeThread(token: string): boolean {
  return /^M\d/i.test(token) || /^(#?\d+|\d+\/\d+|\d+-\d+\/\d+)-\d+/.test(token);
}

interface Range {
  from?: number;
  to?: number;
  words: string;
}

/** A range, or the sentence that says why it is none. */
function readRange(text: string, entryUnit: LengthUnit): Range | string {
  const parts = text.split('..');
  if (parts.length > 2) return 'give one range, such as 150..200.';
  const bounds: (number | undefined)[] = [];
  for (const part of parts) {
    if (part === '') {
      bounds.push(undefined);
      continue;
    }
    const length = parseLength(part, entryUnit);
    if (!length.ok) return length.message;
    if (length.value < 0) return 'a size is not negative.';
    bounds.push(length.value);
  }
  const [from, to] = bounds;
  const [low = '', high = ''] = parts.map((part) => (part === '' ? '' : withUnit(part, entryUnit)));
  if (parts.length === 1) {
    if (from === undefined) return 'give a size, such as 150 or 150..200.';
    return {
      from: Math.max(0, from - REMEMBERED_WITHIN),
      to: from + REMEMBERED_WITHIN,
      words: `${low}, within ${REMEMBERED_WITHIN} mm`,
    };
  }
  if (from !== undefined && to !== undefined && from > to)
    return 'the first size is the larger one. Turn them round.';
  if (from === undefined && to === undefined) return 'give at least one size, such as 150.. or ..200.';
  const words =
    from === undefined ? `up to ${high}` : to === undefined ? `${low} or more` : `${low} to ${high}`;
  return { ...(from === undefined ? {} : { from }), ...(to === undefined ? {} : { to }), words };
}

function withUnit(text: string, entryUnit: LengthUnit): string {
  return /[a-z"']/i.test(text) ? text : `${text} ${entryUnit}`;
}

function materialNamed(word: string, materials: readonly KnownMaterial[]): KnownMaterial | undefined {
  const wanted = plain(word);
  return (
    materials.find(({ id }) => plain(id) === wanted) ??
    materials.find(({ alsoKnownAs }) => alsoKnownAs.some((name) => plain(name) === wanted)) ??
    materials.find(({ name }) => name.split(/\s+/).some((part) => plain(part) === wanted))
  );
}

function plain(text: string): string {
  return text.toLowerCase().replace(/[^a-z0-9.]/g, '');
}
