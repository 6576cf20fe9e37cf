/** One attempt at one scale, on floating paper: views, sizes and balloons, with what it costs and where it fails. */
import type { Part } from '../../part/part';
import type { Scheme } from '../../scheme/scheme';
import { boxAround } from '../geometry/box';
import type { Box } from '../geometry/box';
import { footprintOf } from '../footprint';
import type { AxisPaper, Candidate, PlacedSize, ReadySize } from '../layout';
import { moveMarks } from '../move';
import type { Group, Mark, ViewMap } from '../sheet';
import { sizeLabel } from '../size-text';
import type { Writing } from '../size-text';
import { strokesOf, textBoxesOf } from '../strokes';
import type { XMap } from '../x-map';
import { placeBalloons } from './balloons';
import type { BalloonWish } from './balloons';
import { choose } from './choose';
import { diameterDrafts } from './diameter-drafts';
import { endView, metalBefore, needsEndView } from './end-view';
import type { EndName, EndView } from './end-view';
import { flatsSize } from './flats-size';
import { interrupt } from './interrupt';
import { noteDrafts } from './note-drafts';
import { shareExtensions } from './share-extensions';
import { stackLengths } from './stack-lengths';
import { weighDrafts } from './weigh';

export interface Arrangement {
  groups: readonly Group[];
  maps: readonly ViewMap[];
  bounds: Box;
  clashes: number;
  /** Mean price of the sizes, cuts counted in. */
  price: number;
  lost: readonly string[];
}

const CUT_PRICE = 0.25;
const BALLOON_ROOM = 16;
/** Clean candidates a size that the chooser gets, and how many are worked out to find them. */
const PLAIN_WORK = { enough: 10, most: 40 } as const;
const NARROW_WORK = { enough: 45, most: 180 } as const;
const DENSE_WORK = { enough: 70, most: 260 } as const;
/** Price of a millimetre past the ends of the view: little, or much where the sheet is narrow. */
const OVERHANG = { roomy: 0.02, narrow: 0.2 } as const;
const NARROW_APART = 8;
/** Across the flats of an end view, at the least, in largest diameters: a view of two flats is narrower than its round. */
const LEAST_ACROSS = 0.5;
/** Shares of the flats that the metal before them may differ by and still be much alike. */
const MUCH_ALIKE = 0.05;

interface Drawing {
  view: string;
  ready: ReadySize;
  marks: readonly Mark[];
  text: Box;
  rotate?: -90;
  onLine?: boolean;
}

function chooseSizes(
  paper: AxisPaper,
  readies: readonly ReadySize[],
  lengths: readonly PlacedSize[],
  narrow: boolean,
) {
  const fixed = lengths.map((l) => l.candidate.print);
  const attempt = (dense: boolean): { placed: PlacedSize[]; clashes: number; cost: number } => {
    const options = readies.map((ready) => {
      const drafts =
        ready.size.anchor.kind === 'across' ? diameterDrafts(paper, ready) : noteDrafts(paper, ready, dense);
      const { enough, most } = dense ? DENSE_WORK : narrow ? NARROW_WORK : PLAIN_WORK;
      return weighDrafts(drafts, paper.print, fixed, {
        enough,
        most,
        overhang: narrow ? OVERHANG.narrow : OVERHANG.roomy,
      });
    });
    const able = readies.map((_, i) => i).filter((i) => (options[i]?.length ?? 0) > 0);
    const choice = choose(able.map((i) => options[i] ?? []));
    const placed = able.flatMap((i, k): PlacedSize[] => {
      const ready = readies[i];
      const candidate: Candidate | undefined = options[i]?.[choice.chosen[k] ?? 0];
      return ready && candidate ? [{ ready, candidate, forView: 'axis' }] : [];
    });
    return { placed, clashes: choice.clashes + (readies.length - able.length), cost: choice.cost };
  };
  const plain = attempt(false);
  if (plain.clashes === 0) return plain;
  const dense = attempt(true);
  return dense.clashes < plain.clashes ? dense : plain;
}

/** The end from which most of the flats is seen; the one that stands on the right where both would do. */
function endToShow(part: Part, writing: Writing): EndName {
  const left = metalBefore(part.body, 'end-left');
  const right = metalBefore(part.body, 'end-right');
  const preferred: EndName = writing.style === 'iso' ? 'end-left' : 'end-right';
  if (Math.abs(left - right) < MUCH_ALIKE) return preferred;
  return left < right ? 'end-left' : 'end-right';
}

/** True where at least one end shows the flats; else their size is noted on the axis view. */
function flatsCanBeSeen(part: Part): boolean {
  return Math.min(metalBefore(part.body, 'end-left'), metalBefore(part.body, 'end-right')) < 1;
}

/** First angle: the view of the left end stands on the right; third angle: on its own side. */
function standsRight(end: EndName, writing: Writing): boolean {
  return (end === 'end-left') === (writing.style === 'iso');
}

interface PlacedEnd {
  view: EndView;
  marks: Mark[];
  sizes: Drawing[];
  centre: number;
}

function placeEnd(
  part: Part,
  paper: AxisPaper,
  readies: readonly ReadySize[],
  bounds: Box,
  apart: number,
): PlacedEnd {
  const { rules, writing, map } = paper;
  const view = endView(part.body, endToShow(part, writing), map.scale, rules.mergeOutlines, rules.centrePast);
  const drawn = readies.flatMap((ready) => {
    const candidate = flatsSize(view, ready, map.scale, rules, writing.style);
    return candidate ? [{ ready, candidate }] : [];
  });
  const own = boxAround([footprintOf(view.marks).bounds, ...drawn.map((d) => d.candidate.print.bounds)]) ?? [
    0, 0, 0, 0,
  ];
  const right = standsRight(view.name, writing);
  const centre = right ? bounds[2] + apart - own[0] : bounds[0] - apart - own[2];
  return {
    view,
    centre,
    marks: moveMarks(view.marks, centre, 0),
    sizes: drawn.map(({ ready, candidate }) => ({
      view: view.name,
      ready,
      marks: moveMarks(candidate.marks(), centre, 0),
      text: [
        candidate.textBox[0] + centre,
        candidate.textBox[1],
        candidate.textBox[2] + centre,
        candidate.textBox[3],
      ],
      rotate: candidate.rotate,
    })),
  };
}

function sizeGroup(drawing: Drawing): Group {
  const { size, label } = drawing.ready;
  return {
    role: 'dimension',
    marks: drawing.marks,
    sizeId: size.id,
    sizeKind: size.kind,
    forView: drawing.view,
    value: Number.isFinite(size.nominal) ? size.nominal : undefined,
    reference: size.reference,
    text: label.text,
  };
}

/** The sizes with their writing: the same at every scale. */
export function readySizes(scheme: Scheme, writing: Writing): ReadySize[] {
  return scheme.sizes.map((size) => ({ size, label: sizeLabel(size, writing) }));
}

/** No arrangement of the part at this scale is narrower on paper. */
export function leastWidth(part: Part, map: XMap): number {
  const drawn = (map.knots[map.knots.length - 1]?.[1] ?? 0) - (map.knots[0]?.[1] ?? 0);
  const hasEnd = needsEndView(part.body) && flatsCanBeSeen(part);
  return drawn + (hasEnd ? part.maxDiameter * map.scale * LEAST_ACROSS + NARROW_APART : 0);
}

/** Lays out the whole drawing at one scale; `balloons` also numbers the sizes; `narrow` saves width where it can. */
export function arrange(
  part: Part,
  readies: readonly ReadySize[],
  paper: AxisPaper,
  balloons: boolean,
  narrow = false,
): Arrangement {
  const { map, writing } = paper;
  const hasEnd = needsEndView(part.body) && flatsCanBeSeen(part);
  const inEnd = readies.filter(
    (r) => hasEnd && r.size.anchor.kind === 'flats' && r.size.kind === 'across-flats',
  );
  const lengths = stackLengths(
    paper,
    readies.filter((r) => r.size.anchor.kind === 'span'),
  );
  const others = readies.filter((r) => r.size.anchor.kind !== 'span' && !inEnd.includes(r));
  const chosen = chooseSizes(paper, others, lengths, narrow);
  const placed = [...lengths, ...chosen.placed];
  const cutMarks = interrupt(shareExtensions(placed.map((p) => p.candidate.marks())));
  const drawings = placed.map((p, i): Drawing => ({
    view: p.forView,
    ready: p.ready,
    marks: cutMarks.marks[i] ?? [],
    text: p.candidate.textBox,
    rotate: p.candidate.rotate,
    onLine: p.candidate.form === 'lane' && writing.style === 'iso',
  }));
  const axisBounds =
    boxAround([paper.print.bounds, ...drawings.map((d) => footprintOf(d.marks).bounds)]) ??
    paper.print.bounds;
  const end = hasEnd
    ? placeEnd(part, paper, inEnd, axisBounds, narrow ? NARROW_APART : paper.rules.viewsApart)
    : null;
  const lostFlats = end ? inEnd.filter((r) => !end.sizes.some((s) => s.ready === r)) : [];
  const all = [...drawings, ...(end?.sizes ?? [])].sort(
    (a, b) => readies.indexOf(a.ready) - readies.indexOf(b.ready),
  );
  const viewMarks = [...paper.marks, ...(end?.marks ?? [])];
  const bounds =
    boxAround([
      axisBounds,
      ...(end ? [footprintOf(end.marks).bounds, ...end.sizes.map((s) => footprintOf(s.marks).bounds)] : []),
    ]) ?? axisBounds;
  const numbered = balloons
    ? number(all, viewMarks, bounds, paper.rules.balloonRadius)
    : { groups: [], lost: [] };
  const total = boxAround([bounds, ...numbered.groups.map((g) => footprintOf(g.marks).bounds)]) ?? bounds;
  const groups: Group[] = [
    {
      role: 'view',
      view: 'axis',
      scale: map.scale,
      broken: map.breaks.length > 0 ? true : undefined,
      marks: paper.marks,
    },
    ...(end ? [{ role: 'view' as const, view: end.view.name, scale: map.scale, marks: end.marks }] : []),
    ...all.map(sizeGroup),
    ...numbered.groups,
  ];
  const maps: ViewMap[] = [
    { view: 'axis', scale: map.scale, axisY: 0, knots: map.knots },
    ...(end ? [{ view: end.view.name, scale: map.scale, axisY: 0, centreX: end.centre, knots: [] }] : []),
  ];
  return {
    groups,
    maps,
    bounds: total,
    clashes: chosen.clashes + lostFlats.length + numbered.lost.length,
    price:
      (chosen.cost + lengths.reduce((sum, l) => sum + l.candidate.cost, 0) + CUT_PRICE * cutMarks.cuts) /
      Math.max(1, all.length),
    lost: numbered.lost,
  };
}

function number(
  all: readonly Drawing[],
  viewMarks: readonly Mark[],
  bounds: Box,
  r: number,
): { groups: Group[]; lost: readonly string[] } {
  const wishes = all
    .filter((d) => d.ready.size.balloon > 0)
    .map((d): BalloonWish => ({
      number: d.ready.size.balloon,
      sizeId: d.ready.size.id,
      text: d.text,
      rotate: d.rotate,
      onLine: d.onLine,
    }));
  const marks = [...viewMarks, ...all.flatMap((d) => d.marks)];
  const room = (x: number, y: number, radius: number): boolean =>
    x - radius > bounds[0] - BALLOON_ROOM &&
    x + radius < bounds[2] + BALLOON_ROOM &&
    y - radius > bounds[1] - BALLOON_ROOM &&
    y + radius < bounds[3] + BALLOON_ROOM;
  const placed = placeBalloons(wishes, { texts: textBoxesOf(marks), strokes: strokesOf(marks) }, room, r);
  return {
    groups: placed.balloons.map((b): Group => ({ role: 'balloon', sizeId: b.sizeId, marks: b.marks })),
    lost: placed.lost,
  };
}
