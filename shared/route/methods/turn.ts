import type { Generator } from '../../part/body';
import { constant } from '../../part/generator';
import { addOperation, RuledOut } from '../draft';
import type { Build } from '../draft';
import type { Row } from '../features';
import { rowMax } from '../features';
import { LIMITS } from '../rules';
import type { RuleId } from '../rules';
import { held, partingBlade, turningTool } from '../shop';
import { depthFor, keyOf, metalOver, passesFor, stageOf } from '../session';
import type { Session } from '../session';
import { threadBlank } from './thread-blank';
import { figure } from '../words';

export interface Plateau {
  rows: Row[];
  from: number;
  radius: number;
}

/** Rows worked in this holding, from the held end to the free end. */
export function rowsWorked(session: Session): Row[] {
  return session.view.rows.filter((row) => row.from >= session.from - 1e-9);
}

/** The staircase that roughing leaves: from each plateau to the free end nothing is larger. Largest first. */
export function plateausOf(rows: readonly Row[]): Plateau[] {
  const plateaus: Plateau[] = [];
  let level = 0;
  for (const row of [...rows].reverse()) {
    const radius = rowMax(row);
    const last = plateaus[plateaus.length - 1];
    if (radius > level + 1e-9) {
      plateaus.push({ rows: [row], from: row.from, radius });
      level = radius;
    } else if (last && Math.abs(radius - level) <= 1e-9) {
      last.rows.unshift(row);
      last.from = row.from;
    }
  }
  return plateaus.reverse();
}

/** Rows that stand lower than something between them and the free end: turned behind a collar. */
export function valleysOf(rows: readonly Row[]): Row[] {
  const valleys: Row[] = [];
  let level = 0;
  for (const row of [...rows].reverse()) {
    if (rowMax(row) < level - 1e-9) valleys.push(row);
    level = Math.max(level, rowMax(row));
  }
  return valleys.sort((a, b) => rowMax(b) - rowMax(a) || b.from - a.from);
}

/** Roughs the staircase and the rows behind collars, largest first, leaving one light cut. */
export function roughRows(session: Session): void {
  const rows = rowsWorked(session);
  const jobs = [
    ...plateausOf(rows).map((plateau) => ({
      radius: plateau.radius,
      cut: () => roughPlateau(session, plateau, rows),
    })),
    ...valleysOf(rows).map((row) => ({ radius: rowMax(row), cut: () => roughValley(session, row) })),
  ];
  for (const job of jobs.sort((a, b) => b.radius - a.radius)) job.cut();
}

function roughPlateau(session: Session, plateau: Plateau, rows: readonly Row[]): void {
  const { build, view } = session;
  const leave = LIMITS.roughAllowance.value;
  const stage = stageOf(session);
  const from = runFrom(session, plateau.from);
  const target = plateau.radius + leave;
  const metal = metalOver(session, from, stage.x1, target);
  if (metal <= leave) return;
  const depth = depthFor(
    session,
    'rough-turn',
    stage.x1,
    LIMITS.roughDepth.value,
    `Roughing to Ø${build.words.length(2 * target)}`,
  );
  const cut = passesFor(metal, depth);
  const tool = turningTool(build.register, 'rough');
  const key = keyOf(session, `rough.${plateau.rows[0]?.id ?? ''}`);
  const before = session.done.get('plateau');
  addOperation(build, view, {
    key,
    method: 'rough-turn',
    title: `rough turn Ø${build.words.length(2 * target)}`,
    features: rows.filter((row) => row.to > from + 1e-9).map((row) => row.id),
    tool: tool.name,
    toolItem: tool.item?.id,
    toolMaterial: tool.item?.material === 'carbide' ? 'carbide' : 'hss',
    toolFigures: tool.item?.figures,
    figures: {
      diameter: 2 * (target + metal),
      travel: stage.x1 - from,
      depth: cut.depth,
      passes: cut.passes,
    },
    cut: { kind: 'outer', envelope: constant(from, stage.x1, target) },
    after: before ? [{ key: before, rule: 'rough-large-first' }] : beforeTurning(session),
    stops: [{ toX: from }],
    reasons: ['rough-large-first'],
    check: 'caliper',
    needs: [tool.need],
  });
  session.done.set('rough', key);
  session.done.set('plateau', key);
  leansOnTail(session, key);
}

function roughValley(session: Session, row: Row): void {
  const leave = LIMITS.roughAllowance.value;
  const span = valleySpan(session, row);
  if (metalOver(session, span.from, span.to, rowMax(row) + leave) > leave)
    cutBehindCollar(session, row, rowMax(row) + leave, 'rough-turn');
}

/** Turns every row to size, largest first; rows that the bar is already are left. */
export function finishRows(session: Session): void {
  const { build, view } = session;
  const rows = rowsWorked(session);
  const valleys = new Set(valleysOf(rows).map((row) => row.id));
  const ordered = rows
    .filter((row) => row.kind === 'cylinder' && !valleys.has(row.id))
    .sort((a, b) => rowMax(b) - rowMax(a) || a.from - b.from);
  for (const row of ordered) {
    const stage = stageOf(session);
    const from = runFrom(session, row.from);
    const to = row.to >= view.length - 1e-9 ? stage.x1 : row.to;
    const radius = row.startR;
    const metal = metalOver(session, from, to, radius);
    if (metal <= 1e-9) continue;
    const depth = depthFor(
      session,
      'turn',
      to,
      LIMITS.lightDepth.value,
      `Turning Ø${build.words.length(2 * radius)}`,
    );
    const cut = passesFor(metal, depth);
    const tool = turningTool(build.register, 'finish');
    const key = keyOf(session, `turn.${row.id}`);
    const rough = session.done.get('rough');
    const blank = row.thread ? threadBlank(row.thread) : undefined;
    addOperation(build, view, {
      key,
      method: 'turn',
      title: blank
        ? `turn Ø${build.words.length(blank.diameter)} for the thread`
        : `turn Ø${build.words.length(2 * radius)}`,
      features: [row.id],
      tool: tool.name,
      toolItem: tool.item?.id,
      toolMaterial: tool.item?.material === 'carbide' ? 'carbide' : 'hss',
      toolFigures: tool.item?.figures,
      figures: { diameter: 2 * (radius + metal), travel: to - from, depth: cut.depth, passes: cut.passes },
      cut: { kind: 'outer', envelope: constant(from, to, radius) },
      after: rough ? [{ key: rough, rule: 'rough-before-finish' }] : beforeTurning(session),
      stops: [{ toX: from }],
      reasons: blank ? ['die-blank-under', 'blank-before-thread'] : ['rough-before-finish'],
      ...(blank ? { blank } : {}),
      check: 'caliper',
      needs: [tool.need],
    });
    session.done.set(`row.${row.id}`, key);
    session.done.set('turn', key);
    leansOnTail(session, key);
  }
}

/** Brings rows behind a collar to size. */
export function finishValleys(session: Session): void {
  for (const row of valleysOf(rowsWorked(session))) {
    if (row.kind === 'cone') throw taperBehindCollar();
    cutBehindCollar(session, row, row.startR, 'turn');
  }
}

export function risesToFreeEnd(): RuledOut {
  return new RuledOut(
    'way-in',
    'The taper rises towards the free end of this holding: it is cut from the other end.',
  );
}

export function taperBehindCollar(): RuledOut {
  return new RuledOut(
    'way-in',
    'A taper lies behind a larger diameter in this holding: the top slide cannot pass it.',
  );
}

function valleySpan(session: Session, row: Row): { from: number; to: number } {
  return { from: runFrom(session, row.from), to: row.to };
}

function cutBehindCollar(session: Session, row: Row, radius: number, method: 'rough-turn' | 'turn'): void {
  const { build, view } = session;
  const { from, to } = valleySpan(session, row);
  const metal = metalOver(session, from, to, radius);
  if (metal <= 1e-9) return;
  const width = to - from;
  const reach = metal + LIMITS.collarClear.value;
  const blade = partingBlade(build, reach, width);
  const bladeWidth = blade.item?.figures['width'] ?? 3;
  const narrow = width <= 3 * bladeWidth + 1e-9;
  const tool = narrow ? blade : turningTool(build.register, method === 'turn' ? 'finish' : 'rough', -1);
  const wish = method === 'turn' ? LIMITS.lightDepth.value : LIMITS.roughDepth.value;
  const depth = depthFor(
    session,
    method,
    to,
    wish,
    `Turning Ø${build.words.length(2 * radius)} behind the collar`,
  );
  const cut = passesFor(metal, depth);
  const key = keyOf(session, `${method}.${row.id}`);
  const before = method === 'turn' ? session.done.get('rough') : undefined;
  const blank = method === 'turn' && row.thread ? threadBlank(row.thread) : undefined;
  addOperation(build, view, {
    key,
    method,
    title: `${method === 'rough-turn' ? 'rough turn' : 'turn'} Ø${build.words.length(2 * (blank ? blank.diameter / 2 : radius))} behind the collar`,
    features: [row.id],
    tool: narrow ? tool.name : `${tool.name}, after ${blade.name}`,
    toolItem: tool.item?.id,
    toolMaterial: tool.item?.material === 'carbide' ? 'carbide' : 'hss',
    toolFigures: tool.item?.figures,
    figures: { diameter: 2 * (radius + metal), travel: width, depth: cut.depth, passes: cut.passes },
    cut: { kind: 'outer', envelope: constant(from, to, radius) },
    after: before ? [{ key: before, rule: 'rough-before-finish' }] : beforeTurning(session),
    stops: [{ toX: to }, { toX: from }],
    reasons: ['way-in'],
    ...(blank ? { blank } : {}),
    check: 'caliper',
    needs: narrow ? [blade.need] : [blade.need, tool.need],
    handling: 1.5,
  });
  session.done.set(method === 'turn' ? `row.${row.id}` : 'rough', key);
  if (method === 'turn') session.done.set('turn', key);
  leansOnTail(session, key);
}

/** Cones that fall towards the free end, with the top slide set over. */
export function turnTapers(session: Session): void {
  const { build, view } = session;
  for (const row of rowsWorked(session)) {
    if (row.kind !== 'cone') continue;
    if (row.endR >= row.startR) throw risesToFreeEnd();
    const stage = stageOf(session);
    const last = row.to >= view.length - 1e-9;
    const to = last ? stage.x1 : row.to;
    const slope = (row.endR - row.startR) / (row.to - row.from);
    const farR = row.endR + slope * (to - row.to);
    const centre = session.done.has('centre') ? centreMouth(session) : 0;
    if (last && session.trim > 0 && farR < centre + 0.5)
      throw new RuledOut('centre-before-support', 'The taper leaves no metal for the centre it needs.');
    const metal = taperMetal(session, row, to, slope);
    if (metal <= 1e-9) continue;
    const depth = depthFor(session, 'taper-turn', to, LIMITS.roughDepth.value, 'Taper');
    const cut = passesFor(metal, depth);
    const half = Math.atan(-slope);
    const slant = Math.hypot(row.to - row.from, row.startR - row.endR);
    const path = slant + (to - row.to) / Math.cos(half) + LIMITS.toolRunOff.value;
    const overlap = LIMITS.slideOverlap.value;
    const travel = build.lathe.slideTravel;
    const settings = path <= travel ? 1 : Math.ceil((path - overlap) / (travel - overlap));
    const tool = turningTool(build.register, 'finish');
    const key = keyOf(session, `taper.${row.id}`);
    const after: { key: string; rule: RuleId }[] = [];
    for (const flats of view.flats) {
      const milled = session.done.get(`mill.${flats.id}`);
      if (milled && flats.runOutTo > row.from + 1e-9) after.push({ key: milled, rule: 'flats-before-taper' });
    }
    const rough = session.done.get('rough');
    if (after.length === 0)
      after.push(
        ...(rough ? [{ key: rough, rule: 'rough-before-finish' as const }] : beforeTurning(session)),
      );
    const envelope: Generator =
      last && to > row.to + 1e-9
        ? [
            { kind: 'line', from: row.from, to: row.to, start: row.startR, end: row.endR },
            { kind: 'line', from: row.to, to, start: row.endR, end: farR },
          ]
        : [{ kind: 'line', from: row.from, to: row.to, start: row.startR, end: row.endR }];
    addOperation(build, view, {
      key,
      method: 'taper-turn',
      title: `turn taper, half angle ${figure((half * 180) / Math.PI)}°`,
      features: [row.id],
      tool: tool.name,
      toolItem: tool.item?.id,
      toolMaterial: tool.item?.material === 'carbide' ? 'carbide' : 'hss',
      toolFigures: tool.item?.figures,
      figures: { diameter: 2 * row.startR, travel: path, depth: cut.depth, passes: cut.passes },
      cut: { kind: 'outer', envelope },
      after,
      stops: [{ toX: row.from }],
      halfAngle: (half * 180) / Math.PI,
      slantLength: slant,
      settings,
      reasons: settings > 1 ? ['flats-before-taper', 'two-settings'] : ['flats-before-taper'],
      notes: taperNotes(build, half, slant, path, settings),
      check: 'protractor, and micrometer at the small end',
      needs: [
        tool.need,
        held(
          'setting',
          `top slide at ${figure((half * 180) / Math.PI)}°, slant ${build.words.length(slant)}`,
          build.lathe.id,
          settings === 1
            ? `The slide travels ${build.words.length(travel)}.`
            : `The slide travels ${build.words.length(travel)}: ${settings} settings, overlapping ${build.words.length(overlap)}.`,
        ),
      ],
      handling: 4 * settings,
    });
    session.done.set('taper', key);
    session.done.set(`row.${row.id}`, key);
    leansOnTail(session, key);
  }
}

function taperMetal(session: Session, row: Row, to: number, slope: number): number {
  const stage = stageOf(session);
  let metal = 0;
  const steps = 16;
  for (let k = 0; k <= steps; k += 1) {
    const x = row.from + ((to - row.from) * k) / steps;
    const target = row.startR + slope * (x - row.from);
    const near = 2e-7;
    metal = Math.max(
      metal,
      metalOver(session, Math.max(stage.x0, x - near), Math.min(stage.x1, x + near), target),
    );
  }
  return metal;
}

function centreMouth(session: Session): number {
  const inner = stageOf(session).inner;
  const last = inner[inner.length - 1];
  return last && last.kind === 'line' ? last.end : 0;
}

function taperNotes(
  { words, lathe }: Build,
  half: number,
  slant: number,
  path: number,
  settings: number,
): string[] {
  const notes: string[] = [];
  notes.push(
    `The slide is marked every ${figure(lathe.slideGraduation)}°: set it by a dial on the bar, ${words.length(slant * Math.sin(half))} rise over ${words.length(slant * Math.cos(half))}.`,
  );
  if (settings > 1) {
    const step = lathe.slideTravel - LIMITS.slideOverlap.value;
    for (let k = 1; k < settings; k += 1) {
      const moved = Math.min(k * step, path);
      notes.push(
        `Setting ${k + 1}: carriage on by ${words.length(moved * Math.cos(half))}, cross slide out by ${words.length(moved * Math.sin(half))}; blend near ${words.about(moved)} along the slope.`,
      );
    }
  }
  return notes;
}

function runFrom(session: Session, from: number): number {
  return Math.abs(from - session.from) <= 1e-9 ? from - session.runOn : from;
}

function beforeTurning(session: Session): { key: string; rule: RuleId }[] {
  const centre = session.done.get('centre');
  if (session.tail && centre) return [{ key: centre, rule: 'centre-before-support' }];
  const face = session.done.get('face');
  if (face) return [{ key: face, rule: 'datum-first' }];
  const grip = session.done.get('grip');
  return grip ? [{ key: grip, rule: 'grip-first' }] : [];
}

function leansOnTail(session: Session, key: string): void {
  if (session.tail) session.done.set('leans', key);
}
