import { describe, expect, it } from 'vitest';
import {
  ACROSS_FLATS_BY_THREAD,
  acrossCorners,
  acrossFlatsFromDepth,
  depthForSharpCorners,
  depthOfFlat,
  polygonArea,
  polygonCircumradius,
  roundedCorner,
} from '../../shared/standards/hexagons';
import { roughnessFromFeed, feedForRoughness, peakToValley } from '../../shared/standards/roughness';
import { spindleSpeed, surfaceSpeed } from '../../shared/standards/speeds';
import {
  halfAngleFrom,
  halfAngleFromRatio,
  halfAngleFromTaperPerFoot,
  includedFromHalf,
  tailstockOffset,
  taperPerFoot,
} from '../../shared/standards/tapers';
import { toDegrees, toRadians } from '../../shared/units/angle';

describe('arithmetic of practice', () => {
  it('a half angle of 1° is an included angle of 2° (common practice)', () => {
    expect(toDegrees(includedFromHalf(toRadians(1)))).toBeCloseTo(2, 12);
    // The same from a cone that loses 2·tan 1° of diameter for each millimetre.
    expect(toDegrees(halfAngleFrom(10 + 2 * Math.tan(toRadians(1)), 10, 1))).toBeCloseTo(1, 12);
  });

  it('six flats 0.040 in deep on a 3/4 in round leave 0.670 in across flats with rounded corners (common practice)', () => {
    expect(acrossFlatsFromDepth(0.75, 0.04)).toBeCloseTo(0.67, 12);
    expect(depthOfFlat(0.75, 0.67)).toBeCloseTo(0.04, 12);
    const corner = roundedCorner(0.75, 0.67, 6);
    expect(corner.arcLength).toBeGreaterThan(0.04);
    // Flats and arcs close the outline: six chords and six arcs take up the whole turn.
    const angleOfFlat = 2 * Math.asin(corner.flatWidth / 0.75);
    expect(6 * angleOfFlat + (6 * corner.arcLength) / 0.375).toBeCloseTo(2 * Math.PI, 12);
  });

  it('sharp corners on the same bar need 0.0502 in (common practice)', () => {
    const depth = depthForSharpCorners(0.75, 6);
    expect(depth).toBeCloseTo(0.0502, 4);
    expect(roundedCorner(0.75, acrossFlatsFromDepth(0.75, depth) - 1e-9, 6).arcLength).toBe(0);
    expect(roundedCorner(0.75, acrossFlatsFromDepth(0.75, depth) + 1e-6, 6).arcLength).toBeGreaterThan(0);
  });
});

describe('hexagons and polygons (geometry)', () => {
  it.each([
    [4, 4.6188],
    [5, 5.7735],
    [5.5, 6.3509],
    [7, 8.0829],
    [13, 15.0111],
    [19, 21.9393],
  ])('%f mm across flats is %f mm across corners', (flats, corners) => {
    expect(acrossCorners(flats)).toBeCloseTo(corners, 4);
    expect(2 * polygonCircumradius(6, flats / 2)).toBeCloseTo(corners, 4);
  });

  it.each([
    [4, 1.414214],
    [5, 1.236068],
    [6, 1.154701],
    [8, 1.082392],
    [12, 1.035276],
  ])('a polygon of %i faces reaches %f times as far at its corners', (faces, ratio) => {
    expect(polygonCircumradius(faces, 1)).toBeCloseTo(ratio, 6);
  });

  it('a hexagon has an area of 0.866 of the square of its flats', () => {
    expect(polygonArea(6, 1.6)).toBeCloseTo(8.8681, 4);
  });

  it.each([
    ['M5', 8],
    ['M6', 10],
    ['M8', 13],
    ['M10', 16],
    ['M12', 18],
    ['M20', 30],
    ['M30', 46],
    ['M42', 65],
    ['M14', 21],
    ['M48', 75],
  ])('%s takes %i mm across flats (ISO 272; M14 and M48 from memory)', (thread, flats) => {
    expect(ACROSS_FLATS_BY_THREAD[thread]).toBe(flats);
  });
});

describe('tapers', () => {
  it.each([
    [0, 0.6246, 1.4908],
    [1, 0.59858, 1.4287],
    [2, 0.59941, 1.4307],
    [3, 0.60235, 1.4377],
    [4, 0.62326, 1.4876],
    [5, 0.63151, 1.5073],
    [6, 0.62565, 1.4933],
    [7, 0.624, 1.4894],
  ])('Morse %i: %f in per foot is a half angle of %f° (ASME B5.10)', (_number, perFoot, degrees) => {
    const angle = halfAngleFromTaperPerFoot(perFoot);
    expect(Math.abs(toDegrees(angle) - degrees)).toBeLessThanOrEqual(0.00012);
    expect(taperPerFoot(angle)).toBeCloseTo(perFoot, 12);
  });

  it.each([
    [50, 0.5729],
    [48, 0.5968],
    [10, 2.8624],
    [24 / 7, 8.2971],
  ])('1 : %f has a half angle of %f° (formula)', (ratio, degrees) => {
    expect(toDegrees(halfAngleFromRatio(ratio))).toBeCloseTo(degrees, 4);
  });

  it('tailstock set-over (formula)', () => {
    expect(tailstockOffset(40, 30, 100, 250)).toBeCloseTo(12.5, 12);
    expect(tailstockOffset(25, 20, 50, 120)).toBeCloseTo(6, 12);
  });
});

describe('speeds (formula n = 1000 v / π d)', () => {
  it.each([
    [30, 25, 381.97],
    [30, 20, 477.46],
    [100, 50, 636.62],
    [25, 10, 795.77],
    [60, 100, 190.99],
  ])('%f m/min at %f mm is %f rev/min', (speed, diameter, expected) => {
    expect(Math.abs(spindleSpeed(speed, diameter) - expected)).toBeLessThanOrEqual(0.006);
    expect(surfaceSpeed(spindleSpeed(speed, diameter), diameter)).toBeCloseTo(speed, 10);
  });

  it('300 ft/min at half an inch is 2292 rev/min (12 V / π D)', () => {
    expect(spindleSpeed(300 * 0.3048, 12.7)).toBeCloseTo(2291.83, 2);
  });
});

describe('theoretical roughness of turning (formulas)', () => {
  it.each([
    [0.1, 0.4, 3.1373],
    [0.2, 0.4, 12.7017],
    [0.2, 0.8, 6.2746],
    [0.4, 1.2, 16.784],
  ])('feed %f, nose %f: %f µm from peak to valley', (feed, nose, expected) => {
    expect(Math.abs(peakToValley(feed, nose) - expected)).toBeLessThanOrEqual(0.0006);
  });

  it.each([
    [0.2, 0.4, 3.2075],
    [0.1, 0.8, 0.4009],
    [0.25, 1.2, 1.6706],
  ])('feed %f, nose %f: Ra %f µm', (feed, nose, ra) => {
    expect(roughnessFromFeed(feed, nose)).toBeCloseTo(ra, 3);
    expect(feedForRoughness(roughnessFromFeed(feed, nose), nose)).toBeCloseTo(feed, 12);
  });
});
