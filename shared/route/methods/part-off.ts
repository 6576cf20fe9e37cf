import { constant, slice } from '../../part/generator';
import { addOperation } from '../draft';
import { LIMITS } from '../rules';
import type { RuleId } from '../rules';
import { chamferTool, partingBlade } from '../shop';
import type { Pick, Shop } from '../shop';
import { depthFor, keyOf, metalOver, passesFor, stageOf } from '../session';
import type { Session } from '../session';
import { figure } from '../words';

/** Blade for a radius, as the whole plan uses it. */
export function bladeFor(session: { build: Shop }, radius: number): { pick: Pick; width: number } {
  const pick = partingBlade(session.build, radius + LIMITS.collarClear.value);
  return { pick, width: pick.item?.figures['width'] ?? 3 };
}

/** Opens a groove beside the part's held end and cuts the chamfer there, before the piece is parted. */
export function chamferHeldEnd(session: Session, width: number): void {
  const { build, view } = session;
  const row = view.rows[0];
  const chamfer = row?.chamferLeft;
  if (!row || !chamfer) return;
  const envelope = slice(view.part.body.outer, chamfer.from, chamfer.to);
  const small = envelope[0]?.kind === 'line' ? envelope[0].start : 0;
  // No deeper than the chamfer needs: the neck still carries the die.
  const floor = Math.max(0.5, small - 0.2);
  const blade = bladeFor(session, row.startR - floor);
  const metal = metalOver(session, -width, 0, floor);
  const depth = depthFor(session, 'groove', 0, LIMITS.roughDepth.value, 'Opening the parting groove');
  const groove = passesFor(metal, depth);
  const key = keyOf(session, 'part-groove');
  const turned = session.done.get(`row.${row.id}`);
  addOperation(build, view, {
    key,
    method: 'groove',
    title: `open the parting groove to Ø${build.words.length(2 * floor)}`,
    features: [],
    tool: blade.pick.name,
    toolItem: blade.pick.item?.id,
    toolFigures: blade.pick.item?.figures,
    figures: { diameter: 2 * (floor + metal), travel: metal, depth: groove.depth, passes: groove.passes },
    cut: { kind: 'outer', envelope: constant(-width, 0, floor) },
    after: turned ? [{ key: turned, rule: 'row-before-groove' }] : [],
    stops: [{ toX: 0 }],
    reasons: ['part-last'],
    check: 'rule',
    needs: [blade.pick.need],
  });
  const degrees = (chamfer.angle * 180) / Math.PI;
  const tool = chamferTool(build.register, degrees);
  const off = metalOver(session, chamfer.from, chamfer.to, small);
  const cut = passesFor(off, depthFor(session, 'chamfer', chamfer.to, Math.min(off, 1), 'Chamfer'));
  const own = keyOf(session, `chamfer.${chamfer.id}`);
  addOperation(build, view, {
    key: own,
    method: 'chamfer',
    title: `chamfer ${build.words.length(chamfer.leg)} × ${figure(degrees)}° beside the parting groove`,
    features: [chamfer.id],
    tool: tool.name,
    toolItem: tool.item?.id,
    toolFigures: tool.item?.figures,
    figures: { diameter: 2 * (small + off), travel: chamfer.leg, depth: cut.depth, passes: cut.passes },
    cut: { kind: 'outer', envelope },
    after: [{ key, rule: 'row-before-chamfer' }],
    stops: [{ toX: chamfer.to }],
    reasons: ['row-before-chamfer'],
    check: 'rule',
    needs: [tool.need],
  });
}

/** Parts the piece off at `cutAt`, leaving the stub in the machine. */
export function partOff(session: Session, cutAt: number, width: number, finishes: boolean): void {
  const { build, view } = session;
  const stage = stageOf(session);
  const radius = metalOver(session, cutAt - width, cutAt, 0);
  const blade = bladeFor(session, radius);
  const key = keyOf(session, 'part');
  const last = build.operations[build.operations.length - 1];
  const after: { key: string; rule: RuleId }[] = last ? [{ key: last.key, rule: 'part-last' }] : [];
  addOperation(build, view, {
    key,
    method: 'part-off',
    title: finishes
      ? 'part off to length'
      : `part off, ${build.words.about(LIMITS.partedAllowance.value)} long`,
    features: finishes ? [view.flipped ? 'right-face' : 'left-face'] : [],
    tool: blade.pick.name,
    toolItem: blade.pick.item?.id,
    toolFigures: blade.pick.item?.figures,
    figures: { diameter: 2 * radius, travel: radius, depth: radius, passes: 1 },
    cut: { kind: 'sever', from: cutAt, to: stage.x1, kerfFrom: cutAt - width, kerfTo: cutAt },
    after,
    stops: [{ toX: cutAt }],
    reasons: ['part-last'],
    notes: ['Slow, with oil, in one steady feed.'],
    check: finishes ? 'caliper over the length; file the pip' : 'caliper',
    needs: [blade.pick.need],
    handling: 1.5,
  });
  session.done.set('part', key);
}
