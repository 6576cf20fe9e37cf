import { STATION_TOLERANCE } from '../part/body';
import type { Part } from '../part/part';
import { roundInward } from '../units/format';
import { completenessOf } from './completeness';
import { redimension, type DatumLength } from './datum';
import type { Scheme, Size } from './scheme';

/** Limits worked out for the bench are given to a hundredth of a millimetre, rounded to the tighter side. */
const DECIMALS = 2;

export type FromDatum = { scheme: Scheme } | { refused: readonly { station: string; message: string }[] };

/**
 * The scheme with its lengths given from one datum face instead of as the designer gave them. Lengths that ran from
 * there already keep their id and balloon; new ones take numbers never used. Refused where a limit could not be held.
 * @param datum id of a station of the part
 */
export function schemeFromDatum(part: Part, scheme: Scheme, datum: string): FromDatum {
  const face = part.stations.find(({ id }) => id === datum);
  const known = lengthStations(part, scheme);
  if (!face || !known.includes(datum)) {
    return {
      refused: [
        {
          station: datum,
          message: `“${datum}” is not a face that lengths run to. Give as-designed or one of ${known.join(', ')}.`,
        },
      ],
    };
  }
  const { lengths, refused } = redimension(part, scheme, datum);
  if (refused.length > 0) return { refused };
  const kept = scheme.sizes.filter(
    ({ kind, anchor, reference }) => kind !== 'length' && !(reference && anchor.kind === 'span'),
  );
  let next = Math.max(0, ...scheme.sizes.map(({ balloon }) => balloon));
  const fromFace = [...lengths]
    .sort((a, b) => a.x - b.x)
    .map((length) => {
      const original = scheme.sizes.find(({ id }) => id === length.original);
      return lengthFrom(face, length, original, original?.balloon ?? (next += 1));
    });
  const sizes = [...fromFace, ...kept];
  return { scheme: { ...scheme, sizes, datum, completeness: completenessOf(part, sizes) } };
}

/** Stations that the designer's lengths fix, in order along the part. */
export function lengthStations(part: Part, scheme: Scheme): string[] {
  const ends = scheme.sizes.flatMap(({ kind, anchor }) =>
    kind === 'length' && anchor.kind === 'span' ? [anchor.from, anchor.to] : [],
  );
  return part.stations
    .filter(({ x }) => ends.some((end) => Math.abs(end - x) <= STATION_TOLERANCE))
    .map(({ id }) => id);
}

function lengthFrom(
  face: { id: string; x: number },
  length: DatumLength,
  original: Size | undefined,
  balloon: number,
): Size {
  const upper = roundInward(length.upperLimit - length.nominal, DECIMALS, 'down');
  const lower = roundInward(length.lowerLimit - length.nominal, DECIMALS, 'up');
  const [from, to] =
    length.x > face.x
      ? [face, { id: length.station, x: length.x }]
      : [{ id: length.station, x: length.x }, face];
  const untouched =
    original !== undefined &&
    length.upperLimit >= original.upperLimit - STATION_TOLERANCE &&
    length.lowerLimit <= original.lowerLimit + STATION_TOLERANCE;
  if (untouched) return original;
  return {
    id: original?.id ?? `from.${face.id}.${length.station}`,
    balloon,
    kind: 'length',
    features: original?.features ?? [],
    nominal: length.nominal,
    upperLimit: length.nominal + upper,
    lowerLimit: length.nominal + lower,
    tolerance: upper === -lower ? { kind: 'symmetric', upper, lower } : { kind: 'limits', upper, lower },
    toleranceSource: `shared from ${face.id}`,
    typed: '',
    reference: false,
    from: from.id,
    to: to.id,
    anchor: { kind: 'span', from: from.x, to: to.x },
  };
}
