import type { Size } from '../../../scheme/scheme';
import { toPart } from '../../x-map';
import { finding, mapOf, ofRole, sizeOf } from '../reading';
import type { CheckRule, ReadGroup, Reading } from '../reading';

/** Drawn points may be off by this much of the part, mm: far under any figure, far over the rounding of doubles. */
const SLACK = 2e-3;
/** A crown's arc is met by its leader within this, mm of the part. */
const ARC_SLACK = 0.02;

function measured(reading: Reading, size: Size, group: ReadGroup): string | null {
  const map = mapOf(reading, group.group.forView);
  if (!map) return 'no view to measure in';
  const { anchor } = size;
  const tips = group.arrows;
  const [a, b] = tips;
  if (!a) return 'no arrow to measure from';
  const part = (x: number): number => toPart(map.knots, x);
  const off = (y: number): number => Math.abs(y - map.axisY) / map.scale;
  const differs = (found: number, meant: number, slack = SLACK): string | null =>
    Math.abs(found - meant) > slack
      ? `${found.toFixed(3)} mm is drawn where ${meant.toFixed(3)} mm is meant`
      : null;
  switch (anchor.kind) {
    case 'span': {
      if (!b) return 'one arrow where two are needed';
      const [from, to] = [part(Math.min(a.x, b.x)), part(Math.max(a.x, b.x))];
      return (
        differs(from, Math.min(anchor.from, anchor.to)) ??
        differs(to, Math.max(anchor.from, anchor.to)) ??
        differs(to - from, size.nominal)
      );
    }
    case 'across': {
      if (!b)
        return differs(2 * off(a.y), size.nominal) ?? between(part(a.x), anchor.from, anchor.to, anchor.at);
      return (
        differs(Math.abs(a.y - b.y) / map.scale, size.nominal) ??
        differs(off(a.y), off(b.y)) ??
        differs(Math.abs(a.x - b.x), 0)
      );
    }
    case 'flats':
      if (!b) return null;
      return differs(Math.hypot(a.x - b.x, a.y - b.y) / map.scale, size.nominal);
    case 'arc': {
      const apex =
        anchor.end === 'left' ? Math.min(anchor.from, anchor.to) : Math.max(anchor.from, anchor.to);
      const centre = anchor.end === 'left' ? apex + anchor.radius : apex - anchor.radius;
      return differs(
        Math.hypot(part(a.x) - centre, off(a.y)),
        size.nominal,
        Math.max(ARC_SLACK, size.nominal * 2e-3),
      );
    }
    case 'corner':
      return Math.hypot(part(a.x) - anchor.x, off(a.y) - anchor.r) > Math.max(SLACK, size.nominal / 2 + SLACK)
        ? 'its leader does not end at the corner'
        : null;
    case 'slope':
      return between(part(a.x), anchor.from, anchor.to, undefined);
  }
}

function between(x: number, from: number, to: number, at: number | undefined): string | null {
  const [lo, hi] =
    at === undefined
      ? [Math.min(from, to), Math.max(from, to)]
      : [Math.min(from, to, at), Math.max(from, to, at)];
  return x < lo - SLACK || x > hi + SLACK ? 'its leader ends on another feature' : null;
}

/** Every size measured again from what is drawn. */
export const geometry: CheckRule = {
  id: 'geometry',
  check: (reading) =>
    ofRole(reading, 'dimension').flatMap((group) => {
      const size = sizeOf(reading, group.group.sizeId);
      if (!size)
        return [finding('geometry', `${group.name} is on the sheet and not in the scheme.`, [group.name])];
      const fault = measured(reading, size, group);
      return fault ? [finding('geometry', `${size.id}: ${fault}.`, [size.id])] : [];
    }),
};
