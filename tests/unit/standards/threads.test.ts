import { describe, expect, it } from 'vitest';
import {
  classSide,
  formatThread,
  internalThreadLimits,
  parseThread,
  threadLimits,
} from '../../../shared/standards/threads';

function read(text: string) {
  const answer = parseThread(text);
  if (!answer.ok) throw new Error(answer.message);
  return answer.value;
}

describe('a thread as designated', () => {
  it.each([
    ['M10', 'M10'],
    ['m10', 'M10'],
    ['M10x1.5', 'M10'],
    ['M10×1,25', 'M10x1.25'],
    ['M10x1.25-6g', 'M10x1.25-6g'],
    ['M16x2-6g', 'M16-6g'],
    ['M12-4g6g', 'M12-4g6g'],
    ['M20x1.5 LH', 'M20x1.5-LH'],
    ['M20 x 1.5 - 6H - LH', 'M20x1.5-6H-LH'],
    ['M16xPh3P1.5', 'M16xPh3P1.5'],
    ['3/8-16 UNC-2A', '3/8-16 UNC-2A'],
    ['1/4-20', '1/4-20 UNC'],
    ['1/4"-28 unf 2b', '1/4-28 UNF-2B'],
    ['.375-16', '3/8-16 UNC'],
    ['1 1/4-7', '1-1/4-7 UNC'],
    ['1-1/4 UNF', '1-1/4-12 UNF'],
    ['#10-24', '#10-24 UNC'],
    ['10-24', '#10-24 UNC'],
    ['1-8', '1-8 UNC'],
    ['1-14', '1-14 UNS'],
    ['1/2-28', '1/2-28 UNEF'],
    ['1/2-13 UNC-2A LH', '1/2-13 UNC-2A-LH'],
    ['1/2 BSW', '1/2-12 BSW'],
    ['3/8-20 BSF', '3/8-20 BSF'],
    ['2BA', '2 BA'],
    ['G1/4 A', 'G1/4-A'],
    ['Tr20x4-7e', 'Tr20x4-7e'],
    ['Tr20x8 (P4)', 'Tr20x8 (P4)'],
    ['3/4-6 ACME-2G', '3/4-6 ACME-2G'],
  ])('%s is %s', (typed, written) => {
    expect(formatThread(read(typed))).toBe(written);
    expect(formatThread(read(written))).toBe(written);
  });

  it('keeps pitch, lead and starts apart', () => {
    expect(read('Tr20x8 (P4)')).toMatchObject({ pitch: 4, lead: 8, starts: 2 });
    expect(read('M16xPh3P1.5')).toMatchObject({ pitch: 1.5, lead: 3, starts: 2 });
    expect(read('1/4-20')).toMatchObject({ pitch: 1.27, lead: 1.27, starts: 1, tpi: 20, major: 6.35 });
  });

  it('says when a pitch is not listed with its diameter', () => {
    expect(read('M10x1.2').uncommon).toBe(true);
    expect(read('M10x1.25').uncommon).toBeUndefined();
    expect(read('1-14').uncommon).toBe(true);
    expect(read('1-12').uncommon).toBeUndefined();
  });

  it.each([
    ['', /No thread was given/],
    ['M13', /neighbours are M12 and M14/],
    ['M0.5', /smallest is M1/],
    ['M500', /largest is M200/],
    ['M15', /M15x1\.5 or M15x1/],
    ['M10x2', /too coarse for M10.*1\.5 mm/],
    ['M10x0', /too fine/],
    ['M10x1.25-9z', /not a metric thread|not a class/],
    ['M16xPh2P1.5', /whole number of starts/],
    ['1/4-10', /too coarse for 1\/4.*1\/4-20 UNC/],
    ['1/2-13 UNF', /not UNF.*1\/2-20 UNF/],
    ['#7-32', /0 to 6, 8, 10 and 12/],
    ['1/3-20', /5\/16 and 3\/8/],
    ['1/4', /threads per inch/],
    ['1/2-13 BSW', /12 threads per inch/],
    ['17 BA', /0 BA to 16 BA/],
    ['Tr21x4', /Tr20 and Tr22/],
    ['Tr20x3', /4 and 2 mm/],
    ['NPT 1/4', /not a thread that is read/],
  ])('%j is refused in words', (typed, sentence) => {
    const answer = parseThread(typed);
    expect(answer.ok ? formatThread(answer.value) : answer.message).toMatch(sentence);
  });

  it('gives limits of the usual class when none is typed, and none for a series without a table', () => {
    expect(threadLimits(read('M10'))?.class).toBe('6g');
    expect(threadLimits(read('M10-6H'))?.class).toBe('6g');
    expect(internalThreadLimits(read('M10-6H'))?.class).toBe('6H');
    expect(threadLimits(read('3/8-16 UNC-3A'))?.class).toBe('3A');
    expect(threadLimits(read('1/2 BSW'))).toBeNull();
    expect(threadLimits(read('M10-7g'))).toBeNull();
    expect([classSide(read('M10-6g')), classSide(read('1/4-20 UNC-2B')), classSide(read('M10'))]).toEqual([
      'external',
      'internal',
      null,
    ]);
  });
});
