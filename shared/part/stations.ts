import { STATION_TOLERANCE } from './body';
import type { PlacedInputs } from './features';
import type { Station } from './part';

/**
 * Every change of profile, named and ascending: `left-face`, `<length>.end`, `<chamfer>.edge`, `<crown>.edge`,
 * `<flats>.start`, `<flats>.end`, `<thread>.end`, `right-face`. Where two fall together the earlier kind gives its name.
 */
export function stationsOf(placed: PlacedInputs): Station[] {
  const candidates: Station[] = [
    { id: 'left-face', x: 0 },
    { id: 'right-face', x: placed.length },
    ...placed.lengths.map(({ input, to }) => ({ id: `${input.id}.end`, x: to })),
    ...placed.chamfers.map(({ input, from, to }) => ({
      id: `${input.id}.edge`,
      x: input.end === 'left' ? to : from,
    })),
    ...placed.crowns.map(({ input, from, to }) => ({
      id: `${input.id}.edge`,
      x: input.end === 'left' ? to : from,
    })),
    ...placed.flats.flatMap(({ input, declaredFrom, declaredTo }) => [
      { id: `${input.id}.start`, x: declaredFrom },
      { id: `${input.id}.end`, x: declaredTo },
    ]),
    ...placed.threads.map(({ input, treatment }) => ({
      id: `${input.id}.end`,
      x: input.end === 'right' ? treatment.from : treatment.to,
    })),
  ];
  const kept: Station[] = [];
  for (const candidate of candidates) {
    if (kept.some((station) => Math.abs(station.x - candidate.x) <= STATION_TOLERANCE)) continue;
    kept.push(candidate);
  }
  return kept.sort((a, b) => a.x - b.x);
}
