import { describe, expect, it } from 'vitest';
import { exampleRegister } from '../../../shared/route/example-register';
import { planRoute } from '../../../shared/route/plan';
import type { PlanAnswer } from '../../../shared/route/plan';
import { leadText, wordsIn } from '../../../shared/route/words';
import { sentencesOf } from './sentences';
import { plannedHandle } from './planned';

const HEX = { bar: 19.05, acrossFlats: 17.018, taperEnd: 12.7, taperLength: 88.9, thread: '3/8-16 UNC' };

describe('how lengths are said', () => {
  it('millimetres to a thousandth, inches as the style has them, sawn lengths shorter', () => {
    const mm = wordsIn();
    expect([mm.length(12.3456), mm.about(12.3456), mm.aboutWithUnit(12)]).toEqual([
      '12.346',
      '12.3',
      '12 mm',
    ]);
    const iso = wordsIn('in', 'iso');
    expect([iso.length(17.018), iso.length(1.5875), iso.about(184.8)]).toEqual(['0.67', '0.0625', '7.28']);
    const asme = wordsIn('in', 'asme');
    expect([asme.length(17.018), asme.length(1.5875), asme.length(25.4)]).toEqual(['.670', '.0625', '1.000']);
  });

  it('a lead by its own system, whatever the drawing is typed in', () => {
    expect([1.5, 0.8, 25.4 / 16, 25.4 / 11.5, 3].map(leadText)).toEqual([
      '1.5 mm', '0.8 mm', '16 threads to the inch', '11.5 threads to the inch', '3 mm',
    ]); // prettier-ignore
  });
});

describe('a route in inches', () => {
  const mm = plannedHandle(HEX);
  const asked = { quantity: 1, material: mm.part.material };
  const inch: PlanAnswer = planRoute(mm.part, mm.scheme, exampleRegister, {
    ...asked,
    unit: 'in',
    style: 'asme',
  });

  it('differs from the one in millimetres in its sentences only', () => {
    const figures = (answer: PlanAnswer): string =>
      JSON.stringify(answer, (key, value: unknown) =>
        ['title', 'notes', 'check', 'heldText', 'datumText', 'need', 'why', 'alternatives', 'text', 'how', 'tool'].includes(key) ? undefined : value,
      ); // prettier-ignore
    expect(figures(inch)).toBe(figures(mm.answer));
    expect(sentencesOf(inch)).not.toEqual(sentencesOf(mm.answer));
  });

  it('says flats, bar, taper and stick-out in inches, and the thread by its own name', () => {
    // A size to measure is quoted as it was typed.
    const said = sentencesOf(inch)
      .filter((sentence) => !sentence.startsWith('measure '))
      .join('\n');
    expect(said).toContain('mill 6 flats, .670 across');
    expect(said).toContain('Touch the cutter on the Ø.750, then .040 down a face.');
    expect(said).toContain('3/8-16 UNC');
    for (const metric of ['17.018', '19.05', '88.9', '1.016', '2.54 ']) expect(said).not.toContain(metric);
    expect(said).not.toMatch(/\d mm\b/);
  });
});
