import type { FlatsCut, Generator } from './body';
import { breaks, levelStations, pieceAt } from './generator';
import { crossings, pieceRadius, squareIntegral } from './piece';
import { flatLines } from './polar';
import type { FlatLine } from './polar';
import { integrate } from './quadrature';
import { regionArea } from './section';
import { cornerRadius } from './flats';

/** What lies inside one generator with its flats and outside another with its own, over a span of the axis. */
export interface Shell {
  outer: Generator;
  outerFlats: readonly FlatsCut[];
  inner: Generator;
  innerFlats: readonly FlatsCut[];
  /** A bore that counts as outside too, beside `inner`. */
  bore?: Generator;
}

/**
 * Volume of a shell over [from, to] (mm³), nothing counted where the inside is larger. Split wherever the
 * section changes its nature; then closed form where no flat bites, area × length where the section stays
 * the same, quadrature else.
 */
export function shellVolume(shell: Shell, from: number, to: number): number {
  const stations = splitStations(shell, from, to);
  let volume = 0;
  for (let i = 0; i + 1 < stations.length; i += 1) {
    const a = stations[i] ?? from;
    const b = stations[i + 1] ?? to;
    if (b > a) volume += smoothVolume(shell, a, b);
  }
  return volume;
}

function smoothVolume(shell: Shell, a: number, b: number): number {
  const middle = (a + b) / 2;
  const outer = pieceAt(shell.outer, middle);
  const inner = pieceAt(shell.inner, middle);
  if (!outer) return 0;
  const outerLines = linesOver(shell.outerFlats, middle);
  const innerLines = linesOver(shell.innerFlats, middle);
  const far = pieceRadius(outer, middle);
  const bites = [...outerLines, ...innerLines].some((line) => line.distance < far);
  if (!bites) {
    if (inner && pieceRadius(inner, middle) >= far) return 0;
    return Math.PI * (squareIntegral(outer, a, b) - (inner ? squareIntegral(inner, a, b) : 0));
  }
  const bore = shell.bore ? pieceAt(shell.bore, middle) : null;
  const area = (x: number): number =>
    regionArea(
      { radius: pieceRadius(outer, x), flats: outerLines },
      { radius: inner ? pieceRadius(inner, x) : 0, flats: innerLines },
      bore ? pieceRadius(bore, x) : 0,
    );
  const steady = isLevel(outer) && (!inner || isLevel(inner)) && (!bore || isLevel(bore));
  return steady ? area(middle) * (b - a) : integrate(area, a, b);
}

function isLevel(piece: Generator[number]): boolean {
  return piece.kind === 'line' && piece.start === piece.end;
}

function linesOver(cuts: readonly FlatsCut[], x: number): FlatLine[] {
  return cuts
    .filter((cut) => x > cut.from && x < cut.to)
    .flatMap((cut) => flatLines(cut.count, cut.distance, cut.phase));
}

function splitStations(shell: Shell, from: number, to: number): number[] {
  const stations = [from, to, ...breaks(shell.outer), ...breaks(shell.inner), ...breaks(shell.bore ?? [])];
  const flats = [...shell.outerFlats, ...shell.innerFlats];
  for (const cut of flats) {
    stations.push(cut.from, cut.to);
    for (const level of [cut.distance, cornerRadius(cut)]) {
      if (!Number.isFinite(level)) continue;
      stations.push(
        ...levelStations(shell.outer, level, from, to),
        ...levelStations(shell.inner, level, from, to),
      );
    }
  }
  for (const level of meetingRadii(flats))
    stations.push(
      ...levelStations(shell.outer, level, from, to),
      ...levelStations(shell.inner, level, from, to),
    );
  for (const outer of shell.outer) for (const inner of shell.inner) stations.push(...crossings(outer, inner));
  return [...new Set(stations.filter((x) => x >= from && x <= to))].sort((a, b) => a - b);
}

/** Radii at which a flat of one set passes a flat of another. */
function meetingRadii(cuts: readonly FlatsCut[]): number[] {
  if (cuts.length < 2) return [];
  const lines = cuts.flatMap((cut) => flatLines(cut.count, cut.distance, cut.phase));
  const radii = new Set<number>();
  for (const [index, p] of lines.entries()) {
    for (const q of lines.slice(index + 1)) {
      const turn = Math.sin(q.normal - p.normal);
      if (Math.abs(turn) < 1e-12) continue;
      const x = (p.distance * Math.sin(q.normal) - q.distance * Math.sin(p.normal)) / turn;
      const y = (q.distance * Math.cos(p.normal) - p.distance * Math.cos(q.normal)) / turn;
      radii.add(Math.hypot(x, y));
    }
  }
  return [...radii];
}
