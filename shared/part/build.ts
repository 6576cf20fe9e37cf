import type { Body, Generator } from './body';
import { STATION_TOLERANCE } from './body';
import { placeCentreHole } from './centre-hole';
import { cutCrown, placeCrown } from './crown';
import { maxInner } from './envelope';
import { featuresOf, placeThread } from './features';
import type { PlacedInputs } from './features';
import { constant, joined, largestRadius } from './generator';
import type { InputProblem } from './input-problem';
import { millimetres } from './input-problem';
import { cutChamfers, lengthsOutline, overlappingChamfers, placeChamfer, placeLengths } from './outline';
import type { Part } from './part';
import type { PartInput } from './part-input';
import { placeFlats } from './place-flats';
import { stationsOf } from './stations';

export type BuiltPart = { part: Part } | { problems: InputProblem[] };

/**
 * The one exact Part from what a template says of it, or what cannot be: each problem names the input at fault
 * and gives the allowed range in millimetres. A datum that is no station of the part is ours: throws.
 */
export function buildPart(input: PartInput): BuiltPart {
  const { placed, problems } = placeLengths(input.lengths);
  const last = placed[placed.length - 1];
  if (!last)
    return {
      problems:
        problems.length > 0 ? problems : [{ input: 'lengths', message: 'A part needs at least one length.' }],
    };
  if (problems.length > 0) return { problems };

  const chamfers = collect(input.chamfers, (chamfer) => placeChamfer(chamfer, placed), 'chamfer', problems);
  problems.push(...overlappingChamfers(chamfers));
  let outer: Generator = cutChamfers(lengthsOutline(placed), chamfers);
  const crowns = collect(input.crowns, (crown) => placeCrown(crown, outer), 'crown', problems);
  problems.push(...overlappingCrowns(crowns));
  outer = joined(crowns.reduce(cutCrown, outer));
  const threads = collect(input.threads, (thread) => placeThread(thread, placed), 'thread', problems);
  const flats = collect(input.flats, (flat) => placeFlats(flat, outer), 'flats', problems);
  const centreHoles = collect(input.centreHoles, (hole) => placeCentreHole(hole, outer), 'hole', problems);
  if (problems.length > 0) return { problems };

  const length = last.to;
  const body: Body = {
    x0: 0,
    x1: length,
    outer,
    inner: centreHoles.reduce((inner, hole) => maxInner(inner, hole.envelope), constant(0, length, 0)),
    cuts: flats.map((flat) => flat.cut),
    treatments: threads.map((thread) => thread.treatment),
  };
  const inputs: PlacedInputs = { length, lengths: placed, chamfers, crowns, threads, flats, centreHoles };
  const stations = stationsOf(inputs);
  const datum = stations.find((station) => Math.abs(station.x - input.datum) <= STATION_TOLERANCE);
  if (!datum) throw new Error(`The datum at ${input.datum} is no station of the part`);
  return {
    part: {
      body,
      length,
      maxDiameter: 2 * largestRadius(outer, 0, length),
      material: input.material,
      features: featuresOf(inputs),
      stations,
      datum: datum.id,
    },
  };
}

function collect<I, K extends string, P>(
  inputs: readonly I[],
  place: (input: I) => { [key in K]: P } | { problem: InputProblem },
  key: K,
  problems: InputProblem[],
): P[] {
  const found: P[] = [];
  for (const input of inputs) {
    const result = place(input);
    if ('problem' in result) problems.push(result.problem);
    else found.push(result[key]);
  }
  return found;
}

function overlappingCrowns(
  crowns: readonly { input: { id: string }; from: number; to: number }[],
): InputProblem[] {
  const [first, second] = crowns;
  if (!first || !second || first.from >= second.to || second.from >= first.to) return [];
  return [
    {
      input: second.input.id,
      message: `The crowns of the two ends meet within the part; the other one leaves ${millimetres(
        second.to - second.from - Math.min(first.to, second.to) + Math.max(first.from, second.from),
      )} for this one.`,
    },
  ];
}
