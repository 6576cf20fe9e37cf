// Surface texture that turning leaves by feed and nose radius, and the roughness grades. Formulas; grades: ISO 1302 (standard).

/** Ra in µm of the scallops a round nose leaves: f² / (18 √3 r), feed and radius in mm. */
export function roughnessFromFeed(feedMm: number, noseRadiusMm: number): number {
  return (1000 * feedMm * feedMm) / (18 * Math.sqrt(3) * noseRadiusMm);
}

/** Largest feed in mm/rev that leaves no more than this Ra (µm) at this nose radius (mm). */
export function feedForRoughness(raMicrometres: number, noseRadiusMm: number): number {
  return Math.sqrt((18 * Math.sqrt(3) * noseRadiusMm * raMicrometres) / 1000);
}

/** Height in µm from peak to valley of the scallops: r - √(r² - f²/4). NaN is impossible: a feed over twice the radius gives the radius. */
export function peakToValley(feedMm: number, noseRadiusMm: number): number {
  const under = noseRadiusMm * noseRadiusMm - (feedMm * feedMm) / 4;
  return 1000 * (noseRadiusMm - Math.sqrt(Math.max(0, under)));
}

/** Grade numbers with Ra in µm and the equivalent rounded µin. */
export const ROUGHNESS_GRADES: readonly { grade: string; ra: number; microinch: number }[] = [
  { grade: 'N1', ra: 0.025, microinch: 1 },
  { grade: 'N2', ra: 0.05, microinch: 2 },
  { grade: 'N3', ra: 0.1, microinch: 4 },
  { grade: 'N4', ra: 0.2, microinch: 8 },
  { grade: 'N5', ra: 0.4, microinch: 16 },
  { grade: 'N6', ra: 0.8, microinch: 32 },
  { grade: 'N7', ra: 1.6, microinch: 63 },
  { grade: 'N8', ra: 3.2, microinch: 125 },
  { grade: 'N9', ra: 6.3, microinch: 250 },
  { grade: 'N10', ra: 12.5, microinch: 500 },
  { grade: 'N11', ra: 25, microinch: 1000 },
  { grade: 'N12', ra: 50, microinch: 2000 },
];
