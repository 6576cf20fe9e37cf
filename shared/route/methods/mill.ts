import { flatsSpan } from '../../part/flats';
import { largestRadius, radiusAt } from '../../part/generator';
import type { FlatsFeature } from '../../part/part';
import { addOperation, RuledOut } from '../draft';
import { flatsCutOf } from '../features';
import { LIMITS } from '../rules';
import type { RuleId } from '../rules';
import { endMill, held, short } from '../shop';
import type { Indexing } from '../shop';
import { depthFor, keyOf, passesFor, stageOf } from '../session';
import type { Session } from '../session';

/** Span that the cutter really travels: past the ends that a later taper or the trim clears, exact at a wall. */
export function milledSpan(session: Session, flats: FlatsFeature): { from: number; to: number } {
  const cut = flatsCutOf(session.view.part.body, flats.id);
  return {
    from: cut.from - pastEnd(session, cut.distance, cut.from, -1),
    to: cut.to + pastEnd(session, cut.distance, cut.to, 1),
  };
}

/** How far past an end the flats may run without touching the part: where its outline is within the flats there. */
function pastEnd(session: Session, distance: number, end: number, way: 1 | -1): number {
  const { part, length } = session.view;
  const over = LIMITS.overRun.value;
  if (way > 0 ? end >= length - 1e-9 : end <= 1e-9) return over;
  // Just past the end: arithmetic may leave the station itself on either side of a step.
  const past = end + way * 1e-6;
  const far = Math.min(length, Math.max(0, end + way * over));
  const outside = largestRadius(part.body.outer, Math.min(past, far), Math.max(past, far));
  const beside = radiusAt(part.body.outer, past);
  if (beside > distance + 1e-5 || outside > Math.max(distance, beside) + 1e-5) return 0;
  return over;
}

/** Marks out in blue where the flats end, from the face. */
export function markOut(session: Session, flats: FlatsFeature): void {
  const span = milledSpan(session, flats);
  const key = keyOf(session, `mark.${flats.id}`);
  const scriber = session.build.register.tools.find((t) => t.kind === 'scriber');
  const grip = session.done.get('grip');
  addOperation(session.build, session.view, {
    key,
    method: 'mark-out',
    title: 'mark out the ends of the flats in blue',
    features: [flats.id],
    tool: scriber?.name ?? 'scriber and blue',
    toolItem: scriber?.id,
    figures: null,
    after: grip ? [{ key: grip, rule: 'grip-first' }] : [],
    stops: [{ toX: span.from }],
    reasons: ['mark-before-mill'],
    check: 'rule',
    needs: [
      scriber
        ? held('tool', 'scriber and blue', scriber.id, `${scriber.name}, ${scriber.place}.`)
        : short('tool', 'scriber and blue', 'None in the register.'),
    ],
    handling: 2,
  });
  session.done.set(`mark.${flats.id}`, key);
}

/** Mills the faces of one polygon, indexed from the first. */
export function millFlats(session: Session, flats: FlatsFeature, indexing: Indexing): void {
  const { build, view } = session;
  const { words } = build;
  const cut = flatsCutOf(view.part.body, flats.id);
  const span = milledSpan(session, flats);
  if (span.from < session.gripTo - 1e-9)
    throw new RuledOut('grip-uncut', 'The flats run under the jaws in this holding.');
  const stage = stageOf(session);
  const to = Math.min(span.to, stage.x1);
  const round = largestRadius(stage.outer, Math.max(span.from, stage.x0), to);
  const metal = round - cut.distance;
  if (metal <= 1e-9) return;
  const half = Math.min(
    Math.sqrt(Math.max(0, round * round - cut.distance * cut.distance)),
    flats.count >= 3 ? cut.distance * Math.tan(Math.PI / flats.count) : Infinity,
  );
  const tool = endMill(build, 2 * half);
  const depth = depthFor(session, 'mill-flat', to, LIMITS.millDepth.value, 'Milling the flats');
  const passes = passesFor(metal, depth);
  const arc = roundLeft(round, cut.distance, flats.count);
  const key = keyOf(session, `mill.${flats.id}`);
  const after: { key: string; rule: RuleId }[] = [];
  const marked = session.done.get(`mark.${flats.id}`);
  if (marked) after.push({ key: marked, rule: 'mark-before-mill' });
  const turned = session.done.get('turn') ?? session.done.get('face');
  if (turned) after.push({ key: turned, rule: 'turn-before-mill' });
  const machine = build.mill;
  const travel = to - span.from;
  addOperation(build, view, {
    key,
    method: 'mill-flat',
    title: `mill ${flats.count} flats, ${words.length(2 * cut.distance)} across`,
    features: [flats.id],
    tool: tool.name,
    toolItem: tool.item?.id,
    toolMaterial: tool.item?.material === 'carbide' ? 'carbide' : 'hss',
    toolFigures: tool.item?.figures,
    figures: {
      diameter: tool.item?.figures['diameter'] ?? 16,
      travel: to - span.from + (tool.item?.figures['diameter'] ?? 16),
      depth: passes.depth,
      passes: passes.passes,
    },
    cut: { kind: 'cut', cut: { ...cut, from: Math.max(span.from, stage.x0), to } },
    after,
    stops: [{ toX: flatsSpan({ ...stage, cuts: [] }, { ...cut, from: span.from, to })?.from ?? span.from }],
    depth: metal,
    faces: flats.count,
    reasons: ['flats-before-taper', indexing.rule],
    notes: [
      indexing.text,
      ...(flats.count % 2 === 0 ? [`Measure over all ${flats.count / 2} pairs of flats.`] : []),
      `Touch the cutter on the Ø${words.length(2 * round)}, then ${words.length(metal)} down a face.`,
      arc > 0.02
        ? `The corners stay round, ${words.length(arc)} of arc at each; a face is ${words.length(2 * half)} wide.`
        : `The corners come up sharp; a face is ${words.length(2 * half)} wide.`,
      ...(to > cut.to + 1e-6 || flats.runOutTo > flats.to + 1e-6
        ? ['The flats run on past their length; the taper cut trims their ends.']
        : []),
    ],
    check: 'over opposite flats',
    needs: [
      tool.need,
      indexing.need,
      machine && travel > machine.travelX
        ? short(
            'machine',
            `mill, travel ${words.about(travel)}`,
            `${machine.name} travels ${words.length(machine.travelX)}.`,
            ['send the piece out for its flats'],
          )
        : machine
          ? held(
              'machine',
              `mill, travel ${words.about(travel)}`,
              machine.id,
              `${machine.name}, ${machine.place}.`,
            )
          : short('machine', 'a mill for the flats', 'No mill in the register.', [
              'file the flats to a gauge, slow and less true',
              'send the piece out for its flats',
            ]),
    ],
    handling: indexing.minutesPerFace * flats.count,
  });
  session.done.set(`mill.${flats.id}`, key);
}

/** Arc of the round that is left at each corner (mm). */
export function roundLeft(round: number, distance: number, count: number): number {
  if (count < 3 || distance >= round) return 0;
  const half = Math.sqrt(round * round - distance * distance);
  if (half >= distance * Math.tan(Math.PI / count)) return 0;
  return round * ((2 * Math.PI) / count - 2 * Math.acos(distance / round));
}
