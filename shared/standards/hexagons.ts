// Hexagons and other polygons about the axis, and flats milled on a round. All formulas exact; angles in radians.

/** Corner to corner of a sharp regular hexagon: 2/√3 times across flats. */
export function acrossCorners(acrossFlats: number): number {
  return (acrossFlats * 2) / Math.sqrt(3);
}

/** Radius of the circle through the corners of a regular polygon of n faces each at distance `inscribed` from the axis. */
export function polygonCircumradius(faces: number, inscribed: number): number {
  return inscribed / Math.cos(Math.PI / faces);
}

/** Area of a regular polygon of n faces each at distance `inscribed` from the axis. */
export function polygonArea(faces: number, inscribed: number): number {
  return faces * inscribed * inscribed * Math.tan(Math.PI / faces);
}

/** Depth each face is milled below the round: half the difference of diameters. */
export function depthOfFlat(roundDiameter: number, acrossFlats: number): number {
  return (roundDiameter - acrossFlats) / 2;
}

/** Across flats left when faces lie opposite one another, each milled to this depth below the round. */
export function acrossFlatsFromDepth(roundDiameter: number, depth: number): number {
  return roundDiameter - 2 * depth;
}

/** Depth at which n milled faces just meet in sharp corners on the round. */
export function depthForSharpCorners(roundDiameter: number, faces: number): number {
  return (roundDiameter / 2) * (1 - Math.cos(Math.PI / faces));
}

/**
 * What n faces at half `acrossFlats` from the axis leave of a round: the width of each flat and the arc left at each corner.
 * Sharp corners give an arc of 0; faces that do not reach the round give a flat of 0.
 */
export function roundedCorner(
  roundDiameter: number,
  acrossFlats: number,
  faces: number,
): { flatWidth: number; arcLength: number } {
  const r = roundDiameter / 2;
  const h = acrossFlats / 2;
  if (h >= r) return { flatWidth: 0, arcLength: (2 * Math.PI * r) / faces };
  const chord = Math.sqrt(r * r - h * h);
  const toNeighbour = faces >= 3 ? h * Math.tan(Math.PI / faces) : Number.POSITIVE_INFINITY;
  if (chord >= toNeighbour) return { flatWidth: 2 * toNeighbour, arcLength: 0 };
  return { flatWidth: 2 * chord, arcLength: r * ((2 * Math.PI) / faces - 2 * Math.acos(h / r)) };
}

/** Widths across flats by metric thread, mm. Source: ISO 272, regular series. Certainty: from memory. */
export const ACROSS_FLATS_BY_THREAD: Readonly<Record<string, number>> = {
  'M1.6': 3.2,
  M2: 4,
  'M2.5': 5,
  M3: 5.5,
  'M3.5': 6,
  M4: 7,
  M5: 8,
  M6: 10,
  M7: 11,
  M8: 13,
  M10: 16,
  M12: 18,
  M14: 21,
  M16: 24,
  M18: 27,
  M20: 30,
  M22: 34,
  M24: 36,
  M27: 41,
  M30: 46,
  M33: 50,
  M36: 55,
  M39: 60,
  M42: 65,
  M45: 70,
  M48: 75,
  M52: 80,
  M56: 85,
  M60: 90,
  M64: 95,
};

/** Across flats of bright hexagon bar, mm. Source: DIN 176 / EN 10278 sizes. Certainty: from memory. */
export const HEXAGON_BAR_MM: readonly number[] = [
  3, 3.5, 4, 4.5, 5, 5.5, 6, 7, 8, 9, 10, 11, 12, 13, 14, 15, 16, 17, 18, 19, 20, 21, 22, 24, 27, 30, 32, 36,
  41, 46, 50, 55, 60, 65, 70, 75, 80, 85, 90, 95, 100,
];
