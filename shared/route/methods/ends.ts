import { slice } from '../../part/generator';
import type { Generator } from '../../part/body';
import { centreHoleForWork, parseCentreHole } from '../../standards/centre-holes';
import type { CentreHole } from '../../standards/centre-holes';
import { addOperation, RuledOut } from '../draft';
import { LIMITS } from '../rules';
import type { RuleId } from '../rules';
import { centreDrill, chamferTool, facingTool, formTool } from '../shop';
import { depthFor, keyOf, metalOver, passesFor, stageOf } from '../session';
import type { Session } from '../session';
import type { View } from '../features';
import { figure } from '../words';

/** Faces the free end to where the length with the centre hole ends, or to the part's own end. */
export function faceEnd(session: Session, to: number, finishes: boolean): void {
  const stage = stageOf(session);
  const metal = stage.x1 - to;
  if (metal <= 1e-9) return;
  const trimming = finishes && session.done.has('centre');
  // The centre is drawn back before the length with its hole is faced off.
  if (trimming) session.tail = false;
  const wish = trimming ? 1 : 0.5;
  const depth = depthFor(session, 'face', stage.x1, wish, 'Facing');
  const cut = passesFor(metal, depth);
  const diameter = 2 * metalOver(session, to, stage.x1, 0);
  const tool = facingTool(session.build.register);
  const key = keyOf(session, trimming ? 'trim' : 'face');
  const after: { key: string; rule: RuleId }[] = [];
  const grip = session.done.get('grip');
  if (grip) after.push({ key: grip, rule: 'grip-first' });
  if (trimming) {
    const last = session.done.get('leans');
    if (last) after.push({ key: last, rule: 'support-before-trim' });
  }
  addOperation(session.build, session.view, {
    key,
    method: 'face',
    title: trimming
      ? `face off ${session.build.words.about(metal)} with the centre hole`
      : `face, ${session.build.words.about(metal)} off`,
    features: [session.view.flipped ? 'left-face' : 'right-face'],
    tool: tool.name,
    toolItem: tool.item?.id,
    toolMaterial: tool.item?.material === 'carbide' ? 'carbide' : 'hss',
    toolFigures: tool.item?.figures,
    figures: { diameter, travel: diameter / 2, depth: cut.depth, passes: cut.passes },
    cut: { kind: 'trim', from: stage.x0, to },
    stops: trimming ? [{ toX: to }] : [],
    after,
    reasons: trimming ? ['support-before-trim'] : ['datum-first'],
    check: trimming ? 'caliper over the length' : 'clean all over, no pip',
    needs: [tool.need],
  });
  session.done.set('face', key);
  if (trimming) session.done.set('trim', key);
}

/** The centre a drawn hole names, or the usual one for the diameter that is left. */
export function centreFor(view: View): CentreHole {
  const drawn = view.centreRight;
  if (drawn) {
    const parsed = parseCentreHole(drawn.designation);
    if (parsed.ok && parsed.value) return parsed.value;
  }
  const last = view.rows[view.rows.length - 1];
  if (!last) return centreHoleForWork(10);
  const slope = (last.endR - last.startR) / (last.to - last.from);
  const radius = last.endR + Math.min(0, slope) * BEYOND;
  return centreHoleForWork(Math.max(2, Math.min(2 * radius, 49)));
}

/** A taper goes on falling over the length that the centre stands in; about this much of it (mm). */
const BEYOND = 8;

/** Length beyond the part that a centre hole stands in and is cut away with; 0 where the hole is on the drawing. */
export function trimFor(view: View): number {
  return view.centreRight ? 0 : Math.ceil(centreFor(view).depth + LIMITS.centreTrim.value);
}

/** Drills the centre that the tail enters; on the drawing it stays, else it is faced off later. */
export function drillCentre(session: Session): void {
  const stage = stageOf(session);
  const hole = centreFor(session.view);
  const drawn = session.view.centreRight;
  const tool = centreDrill(session.build.register, hole.pilotDiameter, hole.designation);
  const envelope = drawn
    ? slice(session.view.part.body.inner, drawn.from, drawn.to)
    : centreEnvelope(hole, stage.x1);
  if (!drawn && session.trim <= hole.depth)
    throw new RuledOut(
      'centre-before-support',
      `The centre ${hole.designation} is deeper than the length that is cut away with it.`,
    );
  const key = keyOf(session, 'centre');
  const face = session.done.get('face');
  addOperation(session.build, session.view, {
    key,
    method: 'centre-drill',
    title: drawn ? `centre drill ${hole.designation}` : `centre drill ${hole.designation}, cut away later`,
    features: drawn ? [drawn.id] : [],
    tool: tool.name,
    toolItem: tool.item?.id,
    toolFigures: tool.item?.figures,
    figures: { diameter: hole.mouthDiameter, travel: hole.depth, depth: hole.depth, passes: 1 },
    cut: { kind: 'bore', envelope },
    after: face ? [{ key: face, rule: 'face-before-centre' }] : [],
    reasons: ['centre-before-support'],
    check: `mouth Ø${session.build.words.length(hole.mouthDiameter)}`,
    needs: [tool.need],
  });
  session.done.set('centre', key);
}

function centreEnvelope(hole: CentreHole, face: number): Generator {
  const cone = (hole.mouthDiameter - hole.pilotDiameter) / 2 / Math.tan(hole.coneAngle / 2);
  const pilot = hole.pilotDiameter / 2;
  return [
    { kind: 'line', from: face - hole.depth, to: face - cone, start: pilot, end: pilot },
    { kind: 'line', from: face - cone, to: face, start: pilot, end: hole.mouthDiameter / 2 },
  ];
}

/** The crown on the free end. */
export function turnCrown(session: Session): void {
  const crown = session.view.crownRight;
  if (!crown || crown.to <= session.from) return;
  const build = session.build;
  const tool = formTool(build, crown.radius);
  const metal = metalOver(session, crown.from, crown.to, 0);
  // The tool is fed in along the axis: what it goes through is the height of the crown.
  const height = crown.to - crown.from;
  const depth = Math.min(
    LIMITS.lightDepth.value,
    depthFor(session, 'form-turn', crown.to, LIMITS.lightDepth.value, 'Crown'),
  );
  const cut = passesFor(height, depth);
  const key = keyOf(session, 'crown');
  const after: { key: string; rule: RuleId }[] = [];
  const face = session.done.get('face');
  if (face) after.push({ key: face, rule: 'trim-before-end-form' });
  const taper = session.done.get('taper');
  if (taper && !session.done.has('trim')) after.push({ key: taper, rule: 'taper-before-crown' });
  addOperation(build, session.view, {
    key,
    method: 'form-turn',
    title: `crown R${build.words.length(crown.radius)}`,
    features: [crown.id],
    tool: tool.name,
    toolItem: tool.item?.id,
    toolFigures: tool.item?.figures,
    figures: { diameter: 2 * metal, travel: crown.to - crown.from, depth: cut.depth, passes: cut.passes },
    cut: { kind: 'outer', envelope: slice(session.view.part.body.outer, crown.from, crown.to) },
    after,
    stops: [{ toX: crown.from }],
    reasons: ['trim-before-end-form'],
    check: `radius gauge ${build.words.length(crown.radius)}`,
    needs: [tool.need],
    handling: 2,
  });
  session.done.set('crown', key);
}

/** Chamfers that face the free end, on rows worked here. */
export function cutChamfers(session: Session): void {
  for (const row of session.view.rows) {
    const chamfer = row.chamferRight;
    if (!chamfer || row.from < session.from - 1e-9) continue;
    const degrees = (chamfer.angle * 180) / Math.PI;
    const tool = chamferTool(session.build.register, degrees);
    const envelope = slice(session.view.part.body.outer, chamfer.from, chamfer.to);
    const small = envelope[envelope.length - 1];
    const radius = small && small.kind === 'line' ? small.end : 0;
    const metal = metalOver(session, chamfer.from, chamfer.to, radius);
    if (metal <= 1e-9) continue;
    const depth = depthFor(session, 'chamfer', chamfer.to, Math.min(metal, 1), 'Chamfer');
    const cut = passesFor(metal, depth);
    const key = keyOf(session, `chamfer.${chamfer.id}`);
    const after: { key: string; rule: RuleId }[] = [];
    const turned = session.done.get(`row.${row.id}`);
    if (turned) after.push({ key: turned, rule: 'row-before-chamfer' });
    const trim = session.done.get('trim');
    if (trim && chamfer.to >= session.view.length - 1e-9)
      after.push({ key: trim, rule: 'trim-before-end-form' });
    addOperation(session.build, session.view, {
      key,
      method: 'chamfer',
      title: `chamfer ${session.build.words.length(chamfer.leg)} × ${figure(degrees)}°`,
      features: [chamfer.id],
      tool: tool.name,
      toolItem: tool.item?.id,
      toolFigures: tool.item?.figures,
      figures: { diameter: 2 * (radius + metal), travel: chamfer.leg, depth: cut.depth, passes: cut.passes },
      cut: { kind: 'outer', envelope },
      after,
      stops: [{ toX: chamfer.from }],
      reasons: ['row-before-chamfer'],
      check: 'rule',
      needs: [tool.need],
    });
    session.done.set(`chamfer.${row.id}`, key);
  }
}
