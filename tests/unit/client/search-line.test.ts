import { describe, expect, it } from 'vitest';
import { MATERIALS } from '../../../shared/standards/materials';
import { readSearchLine } from '../../../src/features/drawings/search-line';

const read = (line: string, unit: 'mm' | 'in' = 'mm') => readSearchLine(line, unit, MATERIALS);

describe('the search line', () => {
  it('reads words, a thread and a range of lengths out of one line', () => {
    const { query, read: terms, unread } = read('windlass handle length 150..200 M10');
    expect(query).toEqual({ words: 'windlass handle', thread: 'M10', lengthFrom: 150, lengthTo: 200 });
    expect(terms.map(({ what }) => what)).toEqual(['words', 'length', 'thread']);
    expect(unread).toEqual([]);
  });

  it('leaves one end of a range open', () => {
    expect(read('length 150..').query).toEqual({ lengthFrom: 150 });
    expect(read('diameter ..25').query).toEqual({ diameterTo: 25 });
  });

  it('takes a bare figure in the unit of the shop, and another unit by its name', () => {
    expect(read('length 6..8', 'in').query).toEqual({ lengthFrom: 152.4, lengthTo: 203.2 });
    expect(read('length 150mm..8in', 'mm').query).toEqual({ lengthFrom: 150, lengthTo: 203.2 });
  });

  it('finds what is near a single remembered size, never below nothing', () => {
    expect(read('diameter 25').query).toEqual({ diameterFrom: 24.5, diameterTo: 25.5 });
    expect(read('diameter 0.2').query.diameterFrom).toBe(0);
  });

  it('knows threads from words and from drawing numbers', () => {
    expect(read('M10x1.25-6g').query).toEqual({ thread: 'M10x1.25-6g' });
    expect(read('3/8-16').query.thread).toBe('3/8-16');
    expect(read('Mooring PN-0147 M').query).toEqual({ words: 'Mooring PN-0147 M' });
  });

  it('reads a material by any of its names', () => {
    expect(read('material EN8').query).toEqual({ material: 'steel-medium-carbon' });
    expect(read('material unobtainium').unread).toHaveLength(1);
  });

  it.each(['length 200..150', 'length ..', 'length abc', 'length 1..2..3', 'diameter -5'])(
    'says what is wrong with %s and still reads the rest',
    (wrong) => {
      const { query, unread } = read(`pin ${wrong}`);
      expect(unread).toHaveLength(1);
      expect(query).toEqual({ words: 'pin' });
    },
  );

  it('takes a range word at the end of the line for a word', () => {
    expect(read('length').query).toEqual({ words: 'length' });
  });
});
