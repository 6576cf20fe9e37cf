import type { DraftingStyle } from './sheet';

/** One rule of the drawing office, by style; a figure that layout and sheet check both use. */
export interface DraftingRule {
  iso: number;
  asme: number;
  unit: 'mm' | 'deg' | 'ratio' | 'count';
  reason: string;
  source: string;
}

const PRACTICE = 'common practice';

export const draftingRules = {
  smallestText: {
    iso: 2.5,
    asme: 2.5,
    unit: 'mm',
    reason: 'A copy must stay readable at the bench.',
    source: 'ISO 3098-1, smallest nominal size of lettering',
  },
  sizeText: {
    iso: 3.5,
    asme: 3,
    unit: 'mm',
    reason: 'Height of a capital in a size.',
    source: 'ISO 3098-1; ASME Y14.2',
  },
  smallText: {
    iso: 2.5,
    asme: 2.5,
    unit: 'mm',
    reason: 'Stacked limits, notes, labels of the title block.',
    source: 'ISO 3098-1',
  },
  wideLine: {
    iso: 0.5,
    asme: 0.5,
    unit: 'mm',
    reason: 'Outlines stand out from what measures them.',
    source: 'ISO 128-2, line group 0.5',
  },
  narrowLine: {
    iso: 0.25,
    asme: 0.25,
    unit: 'mm',
    reason: 'Half the outline.',
    source: 'ISO 128-2, line group 0.5',
  },
  lineRatio: {
    iso: 2,
    asme: 2,
    unit: 'ratio',
    reason: 'Two widths, two to one.',
    source: 'ISO 128-2; ASME Y14.2',
  },
  firstLine: {
    iso: 9,
    asme: 10,
    unit: 'mm',
    reason: 'Clear air between part and first figure.',
    source: 'ASME Y14.5 (10 mm); ' + PRACTICE,
  },
  leastFirstLine: {
    iso: 8,
    asme: 10,
    unit: 'mm',
    reason: 'What the check still accepts.',
    source: 'ASME Y14.5 (10 mm); ' + PRACTICE,
  },
  lanePitch: {
    iso: 7.4,
    asme: 8,
    unit: 'mm',
    reason: 'A figure and a balloon fit between two lines.',
    source: PRACTICE,
  },
  leastPitch: {
    iso: 6,
    asme: 6,
    unit: 'mm',
    reason: 'What the check still accepts.',
    source: 'ASME Y14.5 (6 mm)',
  },
  stackedPitch: {
    iso: 9,
    asme: 9,
    unit: 'mm',
    reason: 'Stacked limits are taller than a plain figure.',
    source: PRACTICE,
  },
  extensionGap: {
    iso: 1,
    asme: 1,
    unit: 'mm',
    reason: 'The extension line is not taken for an edge.',
    source: 'ASME Y14.5 (1.5 mm, visible gap)',
  },
  extensionPast: {
    iso: 2,
    asme: 2,
    unit: 'mm',
    reason: 'The line visibly passes the arrow.',
    source: 'ISO 129-1',
  },
  arrowLength: {
    iso: 3,
    asme: 3,
    unit: 'mm',
    reason: 'Arrow as long as a figure is high.',
    source: 'ISO 129-1; ASME Y14.2',
  },
  arrowHalfWidth: {
    iso: 0.5,
    asme: 0.5,
    unit: 'mm',
    reason: 'Length to width three to one.',
    source: 'ASME Y14.2',
  },
  arrowTail: {
    iso: 5.5,
    asme: 5.5,
    unit: 'mm',
    reason: 'A turned arrow needs a piece of line to be seen.',
    source: PRACTICE,
  },
  textLift: {
    iso: 1.75,
    asme: 0,
    unit: 'mm',
    reason: 'Baseline above its line, so that descent and arrows stay clear.',
    source: 'ISO 129-1 (text above the line)',
  },
  textGap: {
    iso: 0.8,
    asme: 0.8,
    unit: 'mm',
    reason: 'Air between a figure and the line that stops beside it.',
    source: PRACTICE,
  },
  centrePast: {
    iso: 3,
    asme: 3,
    unit: 'mm',
    reason: 'A centre line passes the outline by 2 to 3 mm.',
    source: 'ISO 128-2; ' + PRACTICE,
  },
  leaderAngle: {
    iso: 60,
    asme: 60,
    unit: 'deg',
    reason: 'Calm sheets have leaders that lean alike.',
    source: PRACTICE,
  },
  leastLeaderAngle: {
    iso: 30,
    asme: 30,
    unit: 'deg',
    reason: 'A leader must not be taken for a dimension line.',
    source: PRACTICE,
  },
  mostLeaderAngle: {
    iso: 75,
    asme: 75,
    unit: 'deg',
    reason: 'A leader must not be taken for an extension line.',
    source: PRACTICE,
  },
  longestLeader: { iso: 42, asme: 42, unit: 'mm', reason: 'The eye loses a longer one.', source: PRACTICE },
  mergeOutlines: {
    iso: 0.7,
    asme: 0.7,
    unit: 'mm',
    reason: 'Two outlines closer than this print as one blot.',
    source: 'ISO 128-2, least space between lines',
  },
  textClearance: {
    iso: 0.45,
    asme: 0.45,
    unit: 'mm',
    reason: 'Layout keeps more air than the check asks.',
    source: PRACTICE,
  },
  textApart: {
    iso: 0.8,
    asme: 0.8,
    unit: 'mm',
    reason: 'Two figures must not read as one.',
    source: PRACTICE,
  },
  balloonRadius: {
    iso: 3,
    asme: 3,
    unit: 'mm',
    reason: 'Holds the whole box of two figures of 2.5 mm.',
    source: PRACTICE,
  },
  breakGap: { iso: 3, asme: 3, unit: 'mm', reason: 'Air between the two break lines.', source: PRACTICE },
  breakSlenderness: {
    iso: 6,
    asme: 6,
    unit: 'ratio',
    reason: 'Only a slender part is interrupted.',
    source: PRACTICE,
  },
  viewsApart: {
    iso: 12,
    asme: 12,
    unit: 'mm',
    reason: 'Views with their sizes stand clear of one another.',
    source: PRACTICE,
  },
} as const satisfies Record<string, DraftingRule>;

export type RuleName = keyof typeof draftingRules;
export type RuleFigures = Readonly<Record<RuleName, number>>;

function figuresOf(style: DraftingStyle): RuleFigures {
  const names = Object.keys(draftingRules) as RuleName[];
  return Object.fromEntries(names.map((name) => [name, draftingRules[name][style]])) as Record<
    RuleName,
    number
  >;
}

const FIGURES: Readonly<Record<DraftingStyle, RuleFigures>> = {
  iso: figuresOf('iso'),
  asme: figuresOf('asme'),
};

/** The figures of one style, by name. */
export function rulesFor(style: DraftingStyle): RuleFigures {
  return FIGURES[style];
}
