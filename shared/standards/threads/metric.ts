import { quoteGiven, refuse } from '../../units/parsed';
import { listOf, nameNeighbours, type HandedText } from './designation';
import { METRIC_SERIES, coarsestPitchAt } from './metric-series';
import type { BasicSizes, ParsedThread } from './thread-spec';

/** H = √3/2 P. */
const HEIGHT = Math.sqrt(3) / 2;

/**
 * Basic sizes of an ISO metric thread.
 * d2 = D2 = d - 3/4 H; D1 = d - 5/4 H; design root d3 = d - 17/12 H, with H = √3/2 P. Source: ISO 68-1 and ISO 724.
 */
export function metricBasicSizes(major: number, pitch: number): BasicSizes {
  return {
    pitchDiameter: major - (3 / 4) * HEIGHT * pitch,
    minor: major - (5 / 4) * HEIGHT * pitch,
    root: major - (17 / 12) * HEIGHT * pitch,
    includedAngle: Math.PI / 3,
  };
}

const METRIC =
  /^M ?(\d{1,4}(?:[.,]\d{1,3})?)(?: ?x ?(?:Ph ?(\d{1,3}(?:[.,]\d{1,4})?) ?P ?)?(\d{1,3}(?:[.,]\d{1,4})?|[.,]\d{1,4}))?(?: ?-? ?(\d[a-hA-H](?:\d[a-hA-H])?))?$/i;

/** External positions e to h, internal G and H; a pair of grades is pitch diameter first. */
const METRIC_CLASS = /^(?:[3-9][efgh](?:[3-9][efgh])?|[3-9][GH](?:[3-9][GH])?)$/;

export function parseMetricThread({ text, hand }: HandedText): ParsedThread {
  const found = METRIC.exec(text);
  if (!found) {
    return refuse(
      `${quoteGiven(text)} is not a metric thread. Type M and the diameter, with the pitch when it is fine and the class when it is wanted, such as M10, M10x1.25 or M10x1.25-6g.`,
    );
  }
  const figure = (part: string | undefined): number | undefined =>
    part === undefined ? undefined : Number(part.replace(',', '.'));
  const major = figure(found[1]) ?? 0;
  const typedLead = figure(found[2]);
  const typedPitch = figure(found[3]);
  const threadClass = found[4];

  const row = METRIC_SERIES.find(([size]) => size === major);
  if (!row) {
    const sizes = METRIC_SERIES.map(([size]) => ({ size, name: `M${size}` }));
    return refuse(`M${major} is not in the ISO 261 series of diameters. ${nameNeighbours(major, sizes)}`);
  }
  const [, coarse, fine] = row;
  if (typedPitch === undefined && coarse === null) {
    return refuse(
      `M${major} has no coarse pitch in ISO 261. Type one of its pitches: ${listOf(
        fine.map((p) => `M${major}x${p}`),
        'or',
      )}.`,
    );
  }
  const pitch = typedPitch ?? coarse ?? 0;
  const coarsest = coarse ?? coarsestPitchAt(major);
  if (pitch > coarsest) {
    return refuse(
      `A pitch of ${pitch} mm is too coarse for M${major}. The coarsest for this diameter is ${coarsest} mm${fine.length > 0 ? `; the fine pitches are ${listOf(fine)} mm` : ''}.`,
    );
  }
  if (pitch < 0.2 || pitch < major / 100) {
    return refuse(
      `A pitch of ${pitch} mm is too fine for M${major}. Use one of ${listOf([...(coarse === null ? [] : [coarse]), ...fine], 'or')} mm.`,
    );
  }
  const starts = typedLead === undefined ? 1 : typedLead / pitch;
  if (!Number.isInteger(Math.round(starts * 1e6) / 1e6) || starts < 1 || starts > 8) {
    return refuse(
      `A lead of ${typedLead} mm is not a whole number of starts (1 to 8) at a pitch of ${pitch} mm. For two starts type M${major}xPh${pitch * 2}P${pitch}.`,
    );
  }
  if (threadClass !== undefined && !METRIC_CLASS.test(threadClass)) {
    return refuse(
      `${quoteGiven(threadClass)} is not a class of metric thread that is read. Use 6g, 6h, 4g6g or their like on a screw and 6H or 6G in a hole.`,
    );
  }
  const wholeStarts = Math.round(starts);
  const isCoarse = pitch === coarse && wholeStarts === 1;
  return {
    ok: true,
    value: {
      designation: isCoarse
        ? `M${major}`
        : wholeStarts > 1
          ? `M${major}xPh${typedLead}P${pitch}`
          : `M${major}x${pitch}`,
      series: pitch === coarse ? 'metric-coarse' : 'metric-fine',
      major,
      pitch,
      lead: pitch * wholeStarts,
      starts: wholeStarts,
      hand,
      ...(threadClass === undefined ? {} : { class: threadClass }),
      ...metricBasicSizes(major, pitch),
      ...(pitch === coarse || fine.includes(pitch) ? {} : { uncommon: true }),
      basis: { source: 'ISO 261, ISO 724', certainty: 'formula' },
    },
  };
}
