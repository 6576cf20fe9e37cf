/** Across flats in the end view: between two opposite faces that lie upright or level on paper. */
import { arrowHead, lineMark } from '../arrow';
import { makeLabel, placeLabel } from '../label';
import type { Candidate, ReadySize } from '../layout';
import type { RuleFigures } from '../rules';
import type { DraftingStyle, Mark } from '../sheet';
import { candidateOf } from './candidate';
import type { EndView } from './end-view';
import { faceHalfWidth } from '../profile';
import { ASCENT, fontSizeFor } from '../text-metrics';

const LEVEL = 1e-3;
/** What a plain figure reaches under its baseline. */
const PLAIN_DOWN = 1.06;

/** The size drawn about the end view's centre (0, 0), or null where no pair of faces lies square to the paper. */
export function flatsSize(
  view: EndView,
  ready: ReadySize,
  scale: number,
  rules: RuleFigures,
  style: DraftingStyle,
): Candidate | null {
  const { anchor } = ready.size;
  if (anchor.kind !== 'flats') return null;
  const faces = view.normals.find((n) => n.cut === anchor.feature) ?? view.normals[0];
  if (!faces) return null;
  const h = (anchor.acrossFlats / 2) * scale;
  const level = faces.angles.some((a) => Math.abs(Math.cos(a)) < LEVEL);
  const upright = faces.angles.some((a) => Math.abs(Math.sin(a)) < LEVEL);
  const half = faceHalfWidth(
    { kind: 'flats', id: '', from: 0, to: 0, count: faces.angles.length, distance: faces.distance, phase: 0 },
    view.radius / scale,
  );
  if (level) return acrossBelow(view, ready, h, half * scale, rules, style);
  return upright ? acrossBeside(view, ready, h, half * scale, rules, style) : null;
}

/** The figure on (or in) its line and the words under it, where the figure goes between the extension lines. */
function acrossBelow(
  view: EndView,
  ready: ReadySize,
  h: number,
  half: number,
  rules: RuleFigures,
  style: DraftingStyle,
): Candidate {
  const { label } = ready;
  const iso = style === 'iso';
  const figure = makeLabel(label.runs, label.text, label.letter, label.small);
  const lift = rules.textLift + Math.max(0, figure.down - PLAIN_DOWN);
  const y = view.radius + Math.max(rules.firstLine, iso ? figure.up + lift + 1.2 : 0);
  const marks: Mark[] = [-h, h].map((x) =>
    lineMark('extension', x, half + rules.extensionGap, x, y + rules.extensionPast),
  );
  const room = 2 * h;
  const inside = iso ? room >= Math.max(figure.width + 1.6, 8) : room >= figure.width + 9.6;
  const tail = rules.arrowTail;
  if (!inside) {
    marks.push(
      lineMark('dimension', -h - tail, y, h + tail, y),
      arrowHead(-h, y, 1, 0, style),
      arrowHead(h, y, -1, 0, style),
    );
    // Too narrow for its figure: the writing stands under the line, clear of the extension lines' ends.
    return candidateOf(
      'view',
      marks,
      placeLabel(label, -label.width / 2, y + rules.extensionPast + 0.8 + label.up),
      1,
    );
  }
  const gap = figure.width / 2 + rules.textGap;
  if (iso) marks.push(lineMark('dimension', -h, y, h, y));
  else marks.push(lineMark('dimension', -h, y, -gap, y), lineMark('dimension', gap, y, h, y));
  marks.push(arrowHead(-h, y, -1, 0, style), arrowHead(h, y, 1, 0, style));
  const writing = placeLabel(figure, -figure.width / 2, iso ? y - lift : y + (figure.up - figure.down) / 2);
  if (label.under !== undefined) {
    const size = fontSizeFor(label.small);
    const below = Math.max(rules.extensionPast, iso ? 0 : figure.up / 2 + 1) + 0.8;
    writing.push({
      type: 'text',
      x: 0,
      y: y + below + ASCENT * size,
      size,
      anchor: 'middle',
      text: label.under,
    });
  }
  return candidateOf('view', marks, writing, 0.5);
}

function acrossBeside(
  view: EndView,
  ready: ReadySize,
  h: number,
  half: number,
  rules: RuleFigures,
  style: DraftingStyle,
): Candidate {
  const { label } = ready;
  const x = view.radius + Math.max(rules.firstLine, rules.centrePast + 1.6);
  const marks: Mark[] = [-h, h].map((y) =>
    lineMark('extension', half + rules.extensionGap, y, x + rules.extensionPast, y),
  );
  const inside = 2 * h >= 9;
  const tail = inside ? 0 : rules.arrowTail;
  marks.push(lineMark('dimension', x, -h - tail, x, h + tail));
  marks.push(arrowHead(x, -h, 0, inside ? -1 : 1, style), arrowHead(x, h, 0, inside ? 1 : -1, style));
  if (style === 'iso' && 2 * h >= label.width + 1.6)
    return candidateOf(
      'view',
      marks,
      placeLabel(label, x + rules.extensionPast + 0.8 + label.up, label.width / 2, -90),
      0.5,
      -90,
    );
  return candidateOf(
    'view',
    marks,
    placeLabel(label, x + rules.extensionPast + 0.8, (label.up - label.down) / 2),
    0.8,
  );
}
