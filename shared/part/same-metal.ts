import type { Body, FlatsCut, Generator, Treatment } from './body';
import { STATION_TOLERANCE } from './body';
import { minOuter } from './envelope';
import { cornerRadius } from './flats';
import { breaks, constant, joined, radiusAt, spansAbove } from './generator';
import { flatsOf } from './metal';

export interface Span {
  from: number;
  to: number;
}

/** One way in which two bodies are not the same metal, over a span of the axis. */
export interface Difference extends Span {
  kind: 'ends' | 'outer' | 'inner' | 'flats' | 'thread' | 'knurl';
  message: string;
}

interface Marked extends Span {
  key: string;
}

/** A body in the form two ways of making the same metal share: ids dropped, what does not show dropped. */
export interface CanonicalBody {
  x0: number;
  x1: number;
  outer: Generator;
  inner: Generator;
  flats: readonly Marked[];
  treatments: readonly Marked[];
}

/**
 * Canonical form: r held to the corners of its own polygon (a hexagon bar and a milled round are one metal),
 * flats only where r exceeds their distance, compared by number, phase within a face, distance and spans.
 */
export function canonical(body: Body): CanonicalBody {
  const known = KNOWN.get(body);
  if (known) return known;
  const form = canonicalForm(body);
  KNOWN.set(body, form);
  return form;
}

/** Bodies never change, and a stage is compared many times: each form is worked out once. */
const KNOWN = new WeakMap<Body, CanonicalBody>();

function canonicalForm(body: Body): CanonicalBody {
  const flats = flatsOf(body);
  let outer = body.outer;
  for (const cut of flats) {
    if (cut.count >= 3) outer = minOuter(outer, constant(cut.from, cut.to, cornerRadius(cut)));
  }
  return {
    x0: body.x0,
    x1: body.x1,
    outer: joined(outer),
    inner: joined(body.inner),
    flats: visibleFlats(outer, flats, body),
    treatments: merged(
      body.treatments
        .map((treatment) => treatmentMark(treatment, body))
        .filter((mark) => mark.to > mark.from),
    ),
  };
}

function visibleFlats(outer: Generator, flats: readonly FlatsCut[], body: Body): Marked[] {
  const marks = flats.flatMap((cut) => {
    const deeper = flats.filter(
      (other) => sameFaces(other, cut) && other.distance < cut.distance - STATION_TOLERANCE,
    );
    return spansAbove(outer, cut.distance, Math.max(cut.from, body.x0), Math.min(cut.to, body.x1))
      .flatMap((span) => without(span, deeper))
      .map((span) => ({
        ...span,
        key: `${cut.count} flats at ${rounded(cut.distance)} turned ${rounded(turnOf(cut))}`,
      }));
  });
  return merged(marks);
}

function sameFaces(p: FlatsCut, q: FlatsCut): boolean {
  return p.count === q.count && rounded(turnOf(p)) === rounded(turnOf(q));
}

/** Phase within one face's share of the turn, so that any face may be called the first. */
function turnOf(cut: FlatsCut): number {
  const share = (2 * Math.PI) / cut.count;
  const within = ((cut.phase % share) + share) % share;
  return share - within < 1e-6 ? 0 : within;
}

function rounded(value: number): string {
  return (Math.round(value * 1e5) / 1e5).toString();
}

function treatmentMark(treatment: Treatment, body: Body): Marked {
  const from = Math.max(treatment.from, body.x0);
  const to = Math.min(treatment.to, body.x1);
  if (treatment.kind === 'knurl')
    return { from, to, key: `knurl ${treatment.pattern} ${rounded(treatment.pitch)}` };
  const place = treatment.internal ? 'internal' : 'external';
  const figures = [treatment.major, treatment.pitchDiameter, treatment.lead].map(rounded).join(' ');
  return { from, to, key: `thread ${place} ${figures} ${treatment.hand}` };
}

function without(span: Span, holes: readonly Span[]): Span[] {
  let left: Span[] = [span];
  for (const hole of holes) {
    left = left.flatMap((part) => [
      { from: part.from, to: Math.min(part.to, hole.from) },
      { from: Math.max(part.from, hole.to), to: part.to },
    ]);
    left = left.filter((part) => part.to - part.from > STATION_TOLERANCE);
  }
  return left;
}

/** Spans of one key that touch or overlap made one; ascending by key, then place. */
function merged(marks: readonly Marked[]): Marked[] {
  const ordered = [...marks].sort((a, b) => (a.key === b.key ? a.from - b.from : a.key < b.key ? -1 : 1));
  const kept: Marked[] = [];
  for (const mark of ordered) {
    const before = kept[kept.length - 1];
    if (before && before.key === mark.key && mark.from - before.to <= STATION_TOLERANCE)
      kept[kept.length - 1] = { ...before, to: Math.max(before.to, mark.to) };
    else kept.push(mark);
  }
  return kept;
}

/** True where two bodies are one and the same metal to the station tolerance. */
export function sameMetal(a: Body, b: Body): boolean {
  return identical(a, b) || differences(a, b).length === 0;
}

/** The very same figures throughout: then nothing has to be brought to its canonical form. */
function identical(a: Body, b: Body): boolean {
  return (
    a === b ||
    (a.x0 === b.x0 &&
      a.x1 === b.x1 &&
      sameFigures(a.outer, b.outer) &&
      sameFigures(a.inner, b.inner) &&
      sameFigures(a.cuts, b.cuts) &&
      sameFigures(a.treatments, b.treatments))
  );
}

function sameFigures(p: readonly object[], q: readonly object[]): boolean {
  return (
    p.length === q.length &&
    p.every((one, index) => {
      const other = q[index];
      if (other === undefined) return false;
      if (one === other) return true;
      const figures = Object.entries(one);
      return (
        figures.length === Object.keys(other).length &&
        figures.every(([name, value]) => (other as Record<string, unknown>)[name] === value)
      );
    })
  );
}

/** Where two bodies are not the same metal, by kind and span, in the order of the axis within a kind. */
export function differences(a: Body, b: Body): Difference[] {
  const p = canonical(a);
  const q = canonical(b);
  const found: Difference[] = [];
  if (Math.abs(p.x0 - q.x0) > STATION_TOLERANCE)
    found.push({ kind: 'ends', ...ordered(p.x0, q.x0), message: `left end at ${p.x0} and ${q.x0}` });
  if (Math.abs(p.x1 - q.x1) > STATION_TOLERANCE)
    found.push({ kind: 'ends', ...ordered(p.x1, q.x1), message: `right end at ${p.x1} and ${q.x1}` });
  const from = Math.max(p.x0, q.x0);
  const to = Math.min(p.x1, q.x1);
  for (const span of unequalSpans(p.outer, q.outer, from, to))
    found.push({ kind: 'outer', ...span, message: `radius ${radiiText(p.outer, q.outer, span)}` });
  for (const span of unequalSpans(p.inner, q.inner, from, to))
    found.push({ kind: 'inner', ...span, message: `bore ${radiiText(p.inner, q.inner, span)}` });
  found.push(...markDifferences(p.flats, q.flats, () => 'flats'));
  found.push(
    ...markDifferences(p.treatments, q.treatments, (key) => (key.startsWith('knurl') ? 'knurl' : 'thread')),
  );
  return found;
}

function ordered(a: number, b: number): Span {
  return { from: Math.min(a, b), to: Math.max(a, b) };
}

function radiiText(p: Generator, q: Generator, span: Span): string {
  const middle = (span.from + span.to) / 2;
  return `${radiusAt(p, middle)} and ${radiusAt(q, middle)}`;
}

const SAMPLES = [0.001, 0.07, 0.25, 0.5, 0.75, 0.93, 0.999];

/** Spans of [from, to], between stations of either, where the two radii differ. */
export function unequalSpans(p: Generator, q: Generator, from: number, to: number): Span[] {
  const stations = [from, ...[...breaks(p), ...breaks(q)].filter((x) => x > from && x < to), to].sort(
    (a, b) => a - b,
  );
  const spans: Span[] = [];
  for (let i = 0; i + 1 < stations.length; i += 1) {
    const a = stations[i] ?? from;
    const b = stations[i + 1] ?? to;
    if (b - a <= STATION_TOLERANCE) continue;
    if (
      SAMPLES.every((share) => sameRadius(radiusAt(p, a + share * (b - a)), radiusAt(q, a + share * (b - a))))
    )
      continue;
    const before = spans[spans.length - 1];
    if (before && a - before.to <= STATION_TOLERANCE) before.to = b;
    else spans.push({ from: a, to: b });
  }
  return spans;
}

/** Squares are compared, since close to the axis of a crown a radius is the root of a difference of near equals. */
function sameRadius(p: number, q: number): boolean {
  return Math.abs(p * p - q * q) <= 2 * STATION_TOLERANCE * Math.max(p, q, 0.01);
}

function markDifferences(
  p: readonly Marked[],
  q: readonly Marked[],
  kind: (key: string) => Difference['kind'],
): Difference[] {
  const missing = (one: readonly Marked[], other: readonly Marked[], which: string): Difference[] =>
    one
      .filter(
        (mark) =>
          !other.some(
            (twin) => twin.key === mark.key && near(twin.from, mark.from) && near(twin.to, mark.to),
          ),
      )
      .map((mark) => ({
        kind: kind(mark.key),
        from: mark.from,
        to: mark.to,
        message: `${mark.key} only on the ${which}, from ${mark.from} to ${mark.to}`,
      }));
  return [...missing(p, q, 'first'), ...missing(q, p, 'second')];
}

function near(a: number, b: number): boolean {
  // A run-out over a gentle slope moves along the axis far more than the radius that fixes it.
  return Math.abs(a - b) <= 10 * STATION_TOLERANCE;
}
