import { toRadians } from '../../units/angle';
import { inchesToMm } from '../../units/length';
import { quoteGiven, refuse } from '../../units/parsed';
import { nameNeighbours, type HandedText } from './designation';
import { INCH_SIZE, readInchSize, sameInches } from './inch-size';
import type { BasicSizes, ParsedThread, ThreadSpec } from './thread-spec';
import { BA_SIZES, BSF_SIZES, BSW_SIZES, PIPE_SIZES } from './whitworth-series';

/**
 * Basic sizes of the 55° form: d2 = D - 0.640327 P, d1 = D - 1.280654 P for screw and nut alike. Source: BS 84, ISO 228-1.
 */
export function whitworthBasicSizes(major: number, pitch: number): BasicSizes {
  const depth = 0.640327 * pitch;
  return {
    pitchDiameter: major - depth,
    minor: major - 2 * depth,
    root: major - 2 * depth,
    includedAngle: toRadians(55),
  };
}

const SERIES = {
  bsw: { sizes: BSW_SIZES, name: 'BSW', source: 'BS 84' },
  bsf: { sizes: BSF_SIZES, name: 'BSF', source: 'BS 84' },
} as const;

const WHITWORTH = new RegExp(
  String.raw`^${INCH_SIZE}(?: ?[- ] ?(\d{1,2}(?:\.\d)?)(?: ?tpi)?)? ?-? ?(BSW|BSF|whit(?:worth)?\.?)$`,
  'i',
);

export function looksWhitworth(text: string): boolean {
  return /(?:BSW|BSF|whit(?:worth)?\.?)$/i.test(text);
}

export function parseWhitworthThread({ text, hand }: HandedText): ParsedThread {
  const found = WHITWORTH.exec(text);
  const inches = readInchSize(found?.[1] ?? '');
  if (!found || inches === null) {
    return refuse(
      `${quoteGiven(text)} is not a Whitworth thread. Type size and series, such as 1/2 BSW, 1/2-12 BSW or 3/8 BSF.`,
    );
  }
  const series = /bsf/i.test(found[3] ?? '') ? 'bsf' : 'bsw';
  const { sizes, name, source } = SERIES[series];
  const row = sizes.find(([, size]) => sameInches(size, inches));
  if (!row) {
    return refuse(
      `${found[1] ?? ''} in is not a size of ${name}. ${nameNeighbours(
        inches,
        sizes.map(([label, size]) => ({ size, name: label })),
      )}`,
    );
  }
  const [label, size, tpi] = row;
  if (found[2] !== undefined && Number(found[2]) !== tpi) {
    return refuse(
      `${label} ${name} has ${tpi} threads per inch, not ${found[2]}. Type ${label}-${tpi} ${name}.`,
    );
  }
  const major = inchesToMm(size);
  const pitch = inchesToMm(1) / tpi;
  return oneStart({
    designation: `${label}-${tpi} ${name}`,
    series,
    major,
    pitch,
    hand,
    tpi,
    ...whitworthBasicSizes(major, pitch),
    basis: { source, certainty: 'formula' },
  });
}

const BA = /^(?:BA ?(\d{1,2})|(?:no\.? ?|#)?(\d{1,2}) ?BA)$/i;

export function looksBritishAssociation(text: string): boolean {
  return /^BA ?\d|\d ?BA$/i.test(text);
}

/** British Association threads, 47.5°, from the table itself: the rule behind it is rounded size by size. Source: BS 93. */
export function parseBritishAssociationThread({ text, hand }: HandedText): ParsedThread {
  const found = BA.exec(text);
  const number = Number(found?.[1] ?? found?.[2]);
  const row = BA_SIZES.find(([each]) => each === number);
  if (!found || !row)
    return refuse(
      `${quoteGiven(text)} is not a British Association thread. The sizes are 0 BA to 16 BA; type 2 BA.`,
    );
  const [, pitch, major, pitchDiameter, minor] = row;
  return oneStart({
    designation: `${number} BA`,
    series: 'ba',
    major,
    pitch,
    hand,
    pitchDiameter,
    minor,
    root: minor,
    includedAngle: toRadians(47.5),
    basis: { source: 'BS 93', certainty: 'handbook' },
  });
}

const PIPE = new RegExp(String.raw`^(?:G|BSPP?) ?${INCH_SIZE}(?: ?-? ?([AB]))?$`, 'i');

export function looksPipe(text: string): boolean {
  return /^(?:G|BSPP?) ?[\d.]/i.test(text);
}

/** Parallel pipe threads, 55° form. Source: ISO 228-1. */
export function parsePipeThread({ text, hand }: HandedText): ParsedThread {
  const found = PIPE.exec(text);
  const inches = readInchSize(found?.[1] ?? '');
  const row =
    inches === null ? undefined : PIPE_SIZES.find(([label]) => sameInches(readInchSize(label) ?? 0, inches));
  if (!found || inches === null || !row) {
    return refuse(
      `${quoteGiven(text)} is not a parallel pipe thread. Type G and the size, such as G1/4, G3/8 A or G1-1/2; the sizes run from 1/16 to 6.`,
    );
  }
  const [label, major, tpi] = row;
  const pitch = inchesToMm(1) / tpi;
  return oneStart({
    designation: `G${label}`,
    series: 'g',
    major,
    pitch,
    hand,
    tpi,
    ...(found[2] === undefined ? {} : { class: found[2].toUpperCase() }),
    ...whitworthBasicSizes(major, pitch),
    basis: { source: 'ISO 228-1', certainty: 'formula' },
  });
}

function oneStart(thread: Omit<ThreadSpec, 'lead' | 'starts'>): ParsedThread {
  return { ok: true, value: { ...thread, lead: thread.pitch, starts: 1 } };
}
