// Drawing scales, as paper over real. ISO 5455 recommended scales: standard. Inch sheets: common practice (ASME Y14.2 gives no list).

export interface DrawingScale {
  /** As the title block prints it: `1:2`, `5:1`. */
  text: string;
  /** Paper length over real length. */
  factor: number;
}

const scale = (paper: number, real: number): DrawingScale => ({
  text: `${paper}:${real}`,
  factor: paper / real,
});

/** ISO 5455, largest first, as far as a machine part needs. */
export const ISO_SCALES: readonly DrawingScale[] = [
  scale(50, 1),
  scale(20, 1),
  scale(10, 1),
  scale(5, 1),
  scale(2, 1),
  scale(1, 1),
  scale(1, 2),
  scale(1, 5),
  scale(1, 10),
  scale(1, 20),
  scale(1, 50),
  scale(1, 100),
];

/** Scales of inch sheets, largest first. */
export const INCH_SCALES: readonly DrawingScale[] = [
  scale(20, 1),
  scale(10, 1),
  scale(8, 1),
  scale(4, 1),
  scale(2, 1),
  scale(1, 1),
  scale(1, 2),
  scale(1, 4),
  scale(1, 8),
  scale(1, 16),
  scale(1, 32),
];

/** The scale named by a text such as `1:2`, from either list; null for any other. */
export function scaleByText(text: string): DrawingScale | null {
  return [...ISO_SCALES, ...INCH_SCALES].find((entry) => entry.text === text.replace(/\s/g, '')) ?? null;
}
