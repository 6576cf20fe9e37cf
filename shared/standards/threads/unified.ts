import { inchesToMm } from '../../units/length';
import { quoteGiven, refuse } from '../../units/parsed';
import { listOf, nameNeighbours, type HandedText } from './designation';
import { INCH_SIZE, readInchSize, sameInches } from './inch-size';
import type { BasicSizes, ParsedThread, ThreadSeries } from './thread-spec';
import { CONSTANT_PITCH_TPI, UNIFIED_SIZES, fewestTpiAt, type UnifiedSize } from './unified-series';

const HEIGHT = Math.sqrt(3) / 2;

/**
 * Basic sizes of a unified thread, mm. d2 = D - 3/4 H, D1 = D - 5/4 H, rounded root (UNR) d3 = D - 11/8 H with H = √3/2 P.
 * Source: ASME B1.1.
 */
export function unifiedBasicSizes(major: number, pitch: number): BasicSizes {
  return {
    pitchDiameter: major - (3 / 4) * HEIGHT * pitch,
    minor: major - (5 / 4) * HEIGHT * pitch,
    root: major - (11 / 8) * HEIGHT * pitch,
    includedAngle: Math.PI / 3,
  };
}

const UNIFIED = new RegExp(
  String.raw`^(?:(?:#|no\.? ?)(\d{1,2})|${INCH_SIZE})(?: ?[-x ] ?(\d{1,3}(?:\.\d)?)(?: ?tpi)?)?(?: ?-? ?(UNRC|UNRF|UNREF|UNEF|UNC|UNF|UNS|UNR|UN))?(?: ?-? ?([123][AB]))?$`,
  'i',
);

/** True when a text has the look of a unified designation, so that its own sentence is given. */
export function looksUnified(text: string): boolean {
  return UNIFIED.test(text) || /\bUN(?:C|F|EF|S|R)?\b/i.test(text) || /^#/.test(text);
}

export function parseUnifiedThread({ text, hand }: HandedText): ParsedThread {
  const found = UNIFIED.exec(text);
  if (!found) {
    return refuse(
      `${quoteGiven(text)} is not a unified thread. Type the size, the threads per inch and the series, such as 3/8-16 UNC, 1/4-28 UNF-2A or #10-24.`,
    );
  }
  const tpiTyped = found[3] === undefined ? undefined : Number(found[3]);
  const seriesTyped = found[4]?.toUpperCase().replace('UNR', 'UN');
  const threadClass = found[5]?.toUpperCase();
  const size = findSize(found[1], found[2], tpiTyped);
  if (!size) return refuse(unknownSize(found[1], found[2]));

  const listed = { UNC: size.unc, UNF: size.unf, UNEF: size.unef };
  let tpi = tpiTyped;
  if (tpi === undefined) {
    if (seriesTyped !== 'UNC' && seriesTyped !== 'UNF' && seriesTyped !== 'UNEF') {
      return refuse(`${quoteGiven(text)} does not say its threads per inch. ${offerSeries(size)}`);
    }
    tpi = listed[seriesTyped];
    if (tpi === undefined)
      return refuse(`${size.name} is not in the ${seriesTyped} series. ${offerSeries(size)}`);
  } else if (
    (seriesTyped === 'UNC' || seriesTyped === 'UNF' || seriesTyped === 'UNEF') &&
    listed[seriesTyped] !== tpi
  ) {
    return refuse(`${size.name} with ${tpi} threads per inch is not ${seriesTyped}. ${offerSeries(size)}`);
  }
  const fewest = fewestTpiAt(size.inches);
  if (tpi < fewest) {
    return refuse(
      `${tpi} threads per inch is too coarse for ${size.name}. It takes ${fewest} or more. ${offerSeries(size)}`,
    );
  }
  if (tpi > 80 || tpi * size.inches > 100) {
    return refuse(`${tpi} threads per inch is too fine for ${size.name}. ${offerSeries(size)}`);
  }
  const series = seriesOf(size, tpi);
  const major = inchesToMm(size.inches);
  const pitch = inchesToMm(1) / tpi;
  return {
    ok: true,
    value: {
      designation: `${size.name}-${tpi} ${series.toUpperCase()}`,
      series,
      major,
      pitch,
      lead: pitch,
      starts: 1,
      hand,
      ...(threadClass === undefined ? {} : { class: threadClass }),
      ...unifiedBasicSizes(major, pitch),
      tpi,
      ...(series === 'un' || series === 'uns' ? { uncommon: true } : {}),
      basis: { source: 'ASME B1.1', certainty: 'formula' },
    },
  };
}

/** `10-24` without its mark means #10 when no inch size of that name has such a thread. */
function findSize(
  numbered: string | undefined,
  sized: string | undefined,
  tpi: number | undefined,
): UnifiedSize | undefined {
  if (numbered !== undefined) return UNIFIED_SIZES.find((size) => size.name === `#${Number(numbered)}`);
  const inches = readInchSize(sized ?? '');
  const inInches =
    inches === null ? undefined : UNIFIED_SIZES.find((size) => sameInches(size.inches, inches));
  if (/^\d{1,2}$/.test(sized ?? '') && tpi !== undefined) {
    const asNumber = UNIFIED_SIZES.find((size) => size.name === `#${Number(sized)}`);
    const listedSo = (size: UnifiedSize | undefined): boolean =>
      size !== undefined && [size.unc, size.unf, size.unef].includes(tpi);
    if (!listedSo(inInches) && listedSo(asNumber)) return asNumber;
  }
  return inInches;
}

function seriesOf(size: UnifiedSize, tpi: number): ThreadSeries {
  if (size.unc === tpi) return 'unc';
  if (size.unf === tpi) return 'unf';
  if (size.unef === tpi) return 'unef';
  return CONSTANT_PITCH_TPI.includes(tpi) && size.inches >= 0.25 ? 'un' : 'uns';
}

function offerSeries(size: UnifiedSize): string {
  const offers = [
    size.unc === undefined ? '' : `${size.name}-${size.unc} UNC`,
    size.unf === undefined ? '' : `${size.name}-${size.unf} UNF`,
    size.unef === undefined ? '' : `${size.name}-${size.unef} UNEF`,
  ].filter((offer) => offer !== '');
  return offers.length > 0
    ? `The listed threads are ${listOf(offers)}.`
    : `Type its threads per inch, such as ${size.name}-12 UN.`;
}

function unknownSize(numbered: string | undefined, sized: string | undefined): string {
  if (numbered !== undefined) {
    return `#${numbered} is not a numbered size of the unified series. The numbers are 0 to 6, 8, 10 and 12.`;
  }
  const inches = readInchSize(sized ?? '') ?? 0;
  const sizes = UNIFIED_SIZES.map((size) => ({ size: size.inches, name: size.name }));
  return `${sized ?? ''} in is not a size of the unified series. ${nameNeighbours(inches, sizes)}`;
}
