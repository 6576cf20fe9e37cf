import type { Body } from '../part/body';
import { radiusAt } from '../part/generator';
import { mirrorBody } from '../part/mirror';
import type { PicturePart } from './picture-profile';
import { changedEdges, heldParts, profileMarks, tailCentre } from './picture-profile';
import { stopLine } from './picture-stops';
import { makeXMap, toPaper } from './x-map';

/** A small true profile: its size in its own units and what it is made of, by class, for the screen's own colours. */
export interface Picture {
  width: number;
  height: number;
  parts: readonly PicturePart[];
}

/** What of a set-up a picture shows; a route's SetUp is one. */
export interface PictureSetUp {
  gripFrom: number;
  gripTo: number;
  freeEnd: 'left' | 'right' | 'both' | 'side';
  support?: 'centre' | 'steady' | 'outboard';
  /** Part x the stops are measured from, and what they reach, where the card shows them. */
  stops?: readonly { fromX: number; toX: number }[];
}

export interface PictureSize {
  width?: number;
  height?: number;
}

const LIST = { width: 150, height: 48 } as const;
const CARD = { width: 430, height: 150 } as const;
const MARGIN = 6;
const JAW = 7;
const STOP_ROOM = 16;

function widest(body: Body): number {
  return Math.max(0.1, ...body.outer.map((p) => Math.max(radiusAt([p], p.from), radiusAt([p], p.to))));
}

/** One profile fitted into its frame (150 × 48 unless said): the picture of a part in lists and of a template. */
export function profilePicture(body: Body, size: PictureSize = {}): Picture {
  const width = size.width ?? LIST.width;
  const height = size.height ?? LIST.height;
  const length = body.x1 - body.x0;
  const scale = Math.min((width - 2 * MARGIN) / length, (height - 2 * MARGIN) / (2 * widest(body)));
  const map = makeXMap(body.x0, body.x1, scale, [], 0);
  const left = (width - length * scale) / 2;
  return { width, height, parts: profileMarks(body, map, left, height / 2) };
}

/**
 * The work before and after a set-up, one over the other at one scale on one datum, as it lies in the machine:
 * headstock left, so a piece worked at its left end lies turned round. Metal cut here is heavy, held metal between jaws.
 */
export function pairPicture(before: Body, after: Body, setUp: PictureSetUp, size: PictureSize = {}): Picture {
  const turned = setUp.freeEnd === 'left';
  const a = turned ? mirrorBody(before, 0) : before;
  const b = turned ? mirrorBody(after, 0) : after;
  const place = (x: number): number => (turned ? -x : x);
  const gripFrom = Math.min(place(setUp.gripFrom), place(setUp.gripTo));
  const gripTo = Math.max(place(setUp.gripFrom), place(setUp.gripTo));
  const stops = (setUp.stops ?? []).map((s) => ({ fromX: place(s.fromX), toX: place(s.toX) }));
  const width = size.width ?? CARD.width;
  const height = size.height ?? CARD.height;
  const from = Math.min(a.x0, b.x0);
  const to = Math.max(a.x1, b.x1);
  const centreRoom = setUp.support === 'centre' ? 16 : 0;
  const room = (height - (stops.length > 0 ? STOP_ROOM : 0)) / 2;
  const tall = Math.max(widest(a), widest(b));
  const scale = Math.min(
    (width - 2 * MARGIN - centreRoom) / (to - from),
    (room - 2 * (JAW + 2)) / (2 * tall),
  );
  const map = makeXMap(from, to, scale, [], 0);
  const left = MARGIN + Math.max(0, (width - 2 * MARGIN - centreRoom - (to - from) * scale) / 2);
  const grip = { from: Math.max(gripFrom, from), to: Math.min(gripTo, to) };
  const upper = room / 2;
  const lower = room * 1.5;
  const parts: PicturePart[] = [
    ...profileMarks(a, map, left, upper),
    ...heldParts(a, map, left, upper, grip, JAW),
    ...profileMarks(b, map, left, lower),
    ...changedEdges(a, b, map, left, lower),
    ...heldParts(b, map, left, lower, grip, JAW),
  ];
  if (setUp.support === 'centre')
    parts.push(
      tailCentre(left + toPaper(map.knots, a.x1), upper),
      tailCentre(left + toPaper(map.knots, b.x1), lower),
    );
  if (stops.length > 0) parts.push(stopLine(stops, map, left, lower + tall * scale + JAW + 3));
  return { width, height, parts };
}
