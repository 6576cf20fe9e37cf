// Feeds. Turning and drilling feeds: workshop tables, common practice. Mm per revolution unless said.
import type { CuttingToolMaterial, MachinabilityGroup } from './materials';

/** Drill feed bands: [up to this diameter mm, feed mm/rev]. Middle of the bands of training-manual tables for steel. */
const DRILL_FEED: readonly (readonly [number, number])[] = [
  [1, 0.02],
  [2, 0.03],
  [3.2, 0.04],
  [6.4, 0.08],
  [9.5, 0.12],
  [12.7, 0.15],
  [19, 0.22],
  [25.4, 0.28],
  [Number.POSITIVE_INFINITY, 0.4],
];

/** Share of the steel feed by what is cut. */
const FEED_SHARE: Readonly<Record<MachinabilityGroup, number>> = {
  'free-cutting-steel': 1,
  steel: 1,
  'alloy-steel': 0.75,
  'tool-steel': 0.7,
  stainless: 0.8,
  'cast-iron': 1.2,
  brass: 1.3,
  bronze: 1.1,
  copper: 1,
  aluminium: 1.3,
  titanium: 0.7,
  plastic: 1.2,
};

/** Feed of a twist drill, mm/rev. Source: common practice. */
export function drillFeed(diameterMm: number, group: MachinabilityGroup): number {
  const steel = DRILL_FEED.find(([upTo]) => diameterMm <= upTo)?.[1] ?? 0.4;
  return steel * FEED_SHARE[group];
}

/** Feed of turning, mm/rev, for a bench lathe of small power. Source: common practice. */
export function turningFeed(kind: 'roughing' | 'finishing', group: MachinabilityGroup): number {
  return (kind === 'roughing' ? 0.2 : 0.08) * FEED_SHARE[group];
}

/** Feed of parting and grooving, mm/rev. Source: common practice. */
export function partingFeed(group: MachinabilityGroup): number {
  return 0.05 * FEED_SHARE[group];
}

/** Feed of a reamer, mm/rev: two to three times the drill's. Source: common practice. */
export function reamingFeed(diameterMm: number, group: MachinabilityGroup): number {
  return 2.5 * drillFeed(diameterMm, group);
}

/** Feed for each tooth of an end mill, mm: about a two-hundredth of its diameter, at most 0.12. Source: common practice. */
export function feedPerTooth(
  cutterDiameterMm: number,
  group: MachinabilityGroup,
  tool: CuttingToolMaterial,
): number {
  const steel = Math.min(0.12, cutterDiameterMm / 200);
  return steel * FEED_SHARE[group] * (tool === 'carbide' ? 1.2 : 1);
}

/** Table feed in mm/min: n × z × fz. */
export function tableFeed(revPerMin: number, teeth: number, perTooth: number): number {
  return revPerMin * teeth * perTooth;
}
