/**
 * Areas about the axis in polar form, exactly: every boundary of a section is a circle r = c or a flat
 * r = h / cos(φ − φ0), so ½ ∫ r² dφ is elementary between the angles where one boundary passes another.
 */
export interface FlatLine {
  /** Angle of the flat's normal (rad). */
  normal: number;
  /** Distance from the axis (mm). */
  distance: number;
}

export interface Region {
  /** Outer disc, cut by the outer flats. */
  radius: number;
  flats: readonly FlatLine[];
}

const TURN = 2 * Math.PI;

/** What lies inside `outer` and outside both `inner` and a bore of radius `bore` (mm²); all contain the axis. */
export function areaBetween(outer: Region, inner: Region, bore = 0): number {
  if (outer.radius <= 0) return 0;
  const lines = [...outer.flats, ...inner.flats].filter((line) => line.distance < outer.radius);
  if (lines.length === 0)
    return Math.PI * (outer.radius ** 2 - Math.min(Math.max(inner.radius, bore), outer.radius) ** 2);
  const hole: Boundary = { reach: bore, radius: bore, line: null };
  const angles = passingAngles(lines, [outer.radius, inner.radius, bore]);
  let area = 0;
  for (let i = 0; i < angles.length; i += 1) {
    const from = angles[i] ?? 0;
    const to = angles[i + 1] ?? (angles[0] ?? 0) + TURN;
    if (to - from < 1e-14) continue;
    const middle = (from + to) / 2;
    const far = boundary(outer, middle);
    const edge = boundary(inner, middle);
    const near = edge.reach > bore ? edge : hole;
    if (far.reach <= near.reach) continue;
    area += sweep(far, from, to) - sweep(near, from, to);
  }
  return area;
}

interface Boundary {
  reach: number;
  radius: number;
  line: FlatLine | null;
}

function boundary(region: Region, angle: number): Boundary {
  let found: Boundary = { reach: region.radius, radius: region.radius, line: null };
  for (const line of region.flats) {
    const cosine = Math.cos(angle - line.normal);
    if (cosine <= 0) continue;
    const reach = line.distance / cosine;
    if (reach < found.reach) found = { reach, radius: region.radius, line };
  }
  return found;
}

function sweep(edge: Boundary, from: number, to: number): number {
  if (!edge.line) return (edge.radius ** 2 * (to - from)) / 2;
  const { distance, normal } = edge.line;
  return (distance ** 2 * (Math.tan(to - normal) - Math.tan(from - normal))) / 2;
}

function passingAngles(lines: readonly FlatLine[], radii: readonly number[]): number[] {
  const angles: number[] = [0];
  for (const [index, line] of lines.entries()) {
    for (const radius of radii) {
      if (radius <= line.distance) continue;
      const half = Math.acos(line.distance / radius);
      angles.push(line.normal - half, line.normal + half);
    }
    for (const other of lines.slice(index + 1)) angles.push(...meetingAngles(line, other));
  }
  return angles.map(withinTurn).sort((a, b) => a - b);
}

/** h1 cos(φ − n2) = h2 cos(φ − n1). */
function meetingAngles(p: FlatLine, q: FlatLine): number[] {
  const x = p.distance * Math.cos(q.normal) - q.distance * Math.cos(p.normal);
  const y = p.distance * Math.sin(q.normal) - q.distance * Math.sin(p.normal);
  if (Math.hypot(x, y) < 1e-15) return [];
  const angle = Math.atan2(-x, y);
  return [angle, angle + Math.PI];
}

function withinTurn(angle: number): number {
  const turned = angle % TURN;
  return turned < 0 ? turned + TURN : turned;
}

/** The lines of `count` flats at a distance, the first at `phase`. */
export function flatLines(count: number, distance: number, phase: number): FlatLine[] {
  return Array.from({ length: count }, (_, index) => ({ normal: phase + (TURN * index) / count, distance }));
}

/**
 * Area left of a disc of radius r by `count` even flats at distance h (mm²): the disc less its segments
 * while they stand apart, the whole polygon once they meet.
 */
export function flattedDisc(radius: number, count: number, distance: number): number {
  if (radius <= distance) return Math.PI * radius * radius;
  if (count >= 3 && radius >= distance / Math.cos(Math.PI / count))
    return count * distance * distance * Math.tan(Math.PI / count);
  const segment =
    radius * radius * Math.acos(distance / radius) -
    distance * Math.sqrt(radius * radius - distance * distance);
  return Math.PI * radius * radius - count * segment;
}
