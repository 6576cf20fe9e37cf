// Tapers of a cone frustum: large end D, small end d, axial length L, all mm; half angle in radians. All formulas exact.

/** Half angle from both ends and the length; negative when the second end is the larger. */
export function halfAngleFrom(largeDiameter: number, smallDiameter: number, length: number): number {
  return Math.atan2(largeDiameter - smallDiameter, 2 * length);
}

/** The far end of a taper that falls from `startDiameter` at this half angle over this length. */
export function endDiameterFrom(startDiameter: number, halfAngle: number, length: number): number {
  return startDiameter - 2 * length * Math.tan(halfAngle);
}

/** Axial length over which a taper at this half angle falls from one diameter to the other. */
export function taperLengthFrom(largeDiameter: number, smallDiameter: number, halfAngle: number): number {
  return (largeDiameter - smallDiameter) / (2 * Math.tan(halfAngle));
}

/** Length along the slope: the travel of a compound slide set over. */
export function slantLength(largeDiameter: number, smallDiameter: number, length: number): number {
  return Math.hypot(length, (largeDiameter - smallDiameter) / 2);
}

/** x of the ratio 1 : x, the length over which the diameter changes by one. Infinity for a cylinder. */
export function taperRatio(largeDiameter: number, smallDiameter: number, length: number): number {
  return length / (largeDiameter - smallDiameter);
}

export function halfAngleFromRatio(x: number): number {
  return Math.atan(1 / (2 * x));
}

export function ratioFromHalfAngle(halfAngle: number): number {
  return 1 / (2 * Math.tan(halfAngle));
}

export function includedFromHalf(halfAngle: number): number {
  return 2 * halfAngle;
}

export function halfFromIncluded(includedAngle: number): number {
  return includedAngle / 2;
}

/** Inches of diameter per foot of length, the older inch way of giving a taper. */
export function taperPerFoot(halfAngle: number): number {
  return 24 * Math.tan(halfAngle);
}

export function halfAngleFromTaperPerFoot(inchesPerFoot: number): number {
  return Math.atan(inchesPerFoot / 24);
}

/** Tailstock set-over for a taper cut between centres: (D - d) × overall length / (2 × taper length). */
export function tailstockOffset(
  largeDiameter: number,
  smallDiameter: number,
  taperLength: number,
  overall: number,
): number {
  return ((largeDiameter - smallDiameter) * overall) / (2 * taperLength);
}
