import { toRadians } from '../../units/angle';
import { inchesToMm } from '../../units/length';
import { quoteGiven, refuse } from '../../units/parsed';
import { listOf, nameNeighbours, type HandedText } from './designation';
import { INCH_SIZE, readInchSize, sameInches } from './inch-size';
import type { BasicSizes, ParsedThread } from './thread-spec';
import { ACME_SIZES, TRAPEZOIDAL_SIZES } from './trapezoidal-series';

/** Crest clearance ac of a trapezoidal thread by pitch, mm: [up to this pitch, clearance]. Source: ISO 2904. */
const CLEARANCE: readonly (readonly [number, number])[] = [
  [1.5, 0.15],
  [5, 0.25],
  [12, 0.5],
  [44, 1],
];

/** Basic sizes of ISO 2904: d2 = d - P/2, D1 = d - P, d3 = d - P - 2 ac. */
export function trapezoidalBasicSizes(major: number, pitch: number): BasicSizes {
  const clearance = CLEARANCE.find(([upTo]) => pitch <= upTo)?.[1] ?? 1;
  return {
    pitchDiameter: major - pitch / 2,
    minor: major - pitch,
    root: major - pitch - 2 * clearance,
    includedAngle: toRadians(30),
  };
}

/** Basic sizes of a general-purpose Acme thread, mm: depth P/2, root clearance 0.020 in to 10 tpi and 0.010 in finer. Source: ASME B1.5. */
export function acmeBasicSizes(major: number, tpi: number): BasicSizes {
  const pitch = inchesToMm(1) / tpi;
  return {
    pitchDiameter: major - pitch / 2,
    minor: major - pitch,
    root: major - pitch - inchesToMm(tpi <= 10 ? 0.02 : 0.01),
    includedAngle: toRadians(29),
  };
}

const FIGURE = String.raw`(\d{1,3}(?:[.,]\d{1,2})?)`;
const TRAPEZOIDAL = new RegExp(
  String.raw`^Tr ?${FIGURE}(?: ?x ?${FIGURE})?(?: ?\(? ?P ?${FIGURE} ?\)?)?(?: ?-? ?(\d[a-zA-Z]))?$`,
  'i',
);

export function looksTrapezoidal(text: string): boolean {
  return /^Tr ?\d/i.test(text);
}

/** Trapezoidal threads: `Tr20x4`, `Tr20x8 (P4)` with lead before pitch, `Tr20x4-7e`. */
export function parseTrapezoidalThread({ text, hand }: HandedText): ParsedThread {
  const found = TRAPEZOIDAL.exec(text);
  if (!found)
    return refuse(
      `${quoteGiven(text)} is not a trapezoidal thread. Type Tr20x4, or Tr20x8 (P4) with the lead first when it has more than one start.`,
    );
  const figure = (part: string | undefined): number | undefined =>
    part === undefined ? undefined : Number(part.replace(',', '.'));
  const major = figure(found[1]) ?? 0;
  const row = TRAPEZOIDAL_SIZES.find(([size]) => size === major);
  if (!row) {
    return refuse(
      `Tr${major} is not in the ISO 2904 series of diameters. ${nameNeighbours(
        major,
        TRAPEZOIDAL_SIZES.map(([size]) => ({ size, name: `Tr${size}` })),
      )}`,
    );
  }
  const [, pitches] = row;
  const lead = figure(found[2]);
  const pitch = figure(found[3]) ?? lead;
  if (lead === undefined || pitch === undefined)
    return refuse(
      `Tr${major} does not say its pitch. Type one of ${listOf(
        pitches.map((p) => `Tr${major}x${p}`),
        'or',
      )}.`,
    );
  if (!pitches.includes(pitch))
    return refuse(
      `Tr${major} has no pitch of ${pitch} mm in ISO 2904. Its pitches are ${listOf(pitches)} mm.`,
    );
  const starts = Math.round((lead / pitch) * 1e6) / 1e6;
  if (!Number.isInteger(starts) || starts < 1 || starts > 8)
    return refuse(`A lead of ${lead} mm is not a whole number of starts (1 to 8) at a pitch of ${pitch} mm.`);
  return {
    ok: true,
    value: {
      designation: starts === 1 ? `Tr${major}x${pitch}` : `Tr${major}x${lead} (P${pitch})`,
      series: 'tr',
      major,
      pitch,
      lead,
      starts,
      hand,
      ...(found[4] === undefined ? {} : { class: found[4] }),
      ...trapezoidalBasicSizes(major, pitch),
      basis: { source: 'ISO 2904', certainty: 'formula' },
    },
  };
}

const ACME = new RegExp(
  String.raw`^${INCH_SIZE} ?[- ] ?(\d{1,2}(?:\.\d)?)(?: ?tpi)? ?-? ?ACME(?: ?-? ?([2-6][GC]))?$`,
  'i',
);

export function looksAcme(text: string): boolean {
  return /\bACME\b/i.test(text);
}

export function parseAcmeThread({ text, hand }: HandedText): ParsedThread {
  const found = ACME.exec(text);
  const inches = readInchSize(found?.[1] ?? '');
  if (!found || inches === null)
    return refuse(
      `${quoteGiven(text)} is not an Acme thread that is read. Type size and threads per inch, such as 3/4-6 ACME or 1-5 ACME-2G.`,
    );
  const row = ACME_SIZES.find(([, size]) => sameInches(size, inches));
  if (!row)
    return refuse(
      `${found[1] ?? ''} in is not a size of the Acme series. ${nameNeighbours(
        inches,
        ACME_SIZES.map(([name, size]) => ({ size, name })),
      )}`,
    );
  const [name, size, usualTpi] = row;
  const tpi = Number(found[2]);
  if (tpi * size < 2.5 || tpi > 16)
    return refuse(
      `${tpi} threads per inch does not suit ${name} Acme. The usual thread is ${name}-${usualTpi} ACME.`,
    );
  const major = inchesToMm(size);
  const pitch = inchesToMm(1) / tpi;
  return {
    ok: true,
    value: {
      designation: `${name}-${tpi} ACME`,
      series: 'acme',
      major,
      pitch,
      lead: pitch,
      starts: 1,
      hand,
      tpi,
      ...(found[3] === undefined ? {} : { class: found[3].toUpperCase() }),
      ...acmeBasicSizes(major, tpi),
      ...(tpi === usualTpi ? {} : { uncommon: true }),
      basis: { source: 'ASME B1.5', certainty: 'formula' },
    },
  };
}
