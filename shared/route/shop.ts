import type { ThreadFeature } from '../part/part';
import type { Chuck, ColletSet, Lathe, Mill, Register, Tool } from './register';
import type { DraftNeed } from './draft';
import { figure } from './words';
import type { Words } from './words';

/** The register, and how lengths are said of it. */
export interface Shop {
  register: Register;
  words: Words;
}

/** Looking things up in the register: the smallest or nearest that will do, and the need it meets or leaves short. */
export interface Pick {
  name: string;
  item?: Tool;
  need: DraftNeed;
}

export function held(kind: DraftNeed['kind'], need: string, by: string | undefined, why: string): DraftNeed {
  return { kind, need, state: 'held', ...(by ? { by } : {}), why, alternatives: [] };
}

export function short(
  kind: DraftNeed['kind'],
  need: string,
  why: string,
  alternatives: readonly string[] = [],
): DraftNeed {
  return { kind, need, state: 'short', why, alternatives };
}

export function alternative(
  kind: DraftNeed['kind'],
  need: string,
  by: string | undefined,
  why: string,
  alternatives: readonly string[],
): DraftNeed {
  return { kind, need, state: 'alternative', ...(by ? { by } : {}), why, alternatives };
}

function pick(found: Tool | undefined, spec: string, buy: string): Pick {
  if (found)
    return {
      name: found.name,
      item: found,
      need: held('tool', spec, found.id, `${found.name}, ${found.place}.`),
    };
  return { name: spec, need: short('tool', spec, `None in the register. ${buy}`) };
}

/** A knife tool of the asked hand; carbide for roughing where there is one, a keen finishing tool else. */
export function turningTool(register: Register, use: 'rough' | 'finish', hand: 1 | -1 = 1): Pick {
  const right = register.tools.filter((t) => t.kind === 'turning' && (t.figures['hand'] ?? 1) === hand);
  const wanted = use === 'rough' ? 'carbide' : 'hss';
  const found = right.find((t) => t.material === wanted) ?? right[0];
  return pick(found, `knife tool, ${hand > 0 ? 'right' : 'left'} hand`, 'Buy or grind one.');
}

export function facingTool(register: Register): Pick {
  const found =
    register.tools.find((t) => t.kind === 'facing') ?? register.tools.find((t) => t.kind === 'turning');
  return pick(found, 'facing tool', 'Buy or grind one.');
}

export function chamferTool(register: Register, degrees: number): Pick {
  const all = register.tools.filter((t) => t.kind === 'chamfering');
  const found = all.find((t) => Math.abs((t.figures['angle'] ?? 45) - degrees) < 0.5);
  return pick(found, `${figure(degrees)}° chamfering tool`, 'Buy or grind one.');
}

/** The narrowest blade that reaches, and is no wider than the gap it must enter. */
export function partingBlade({ register, words }: Shop, reach: number, widest = Infinity): Pick {
  const blades = register.tools
    .filter(
      (t) =>
        t.kind === 'parting' &&
        (t.figures['reach'] ?? 0) >= reach &&
        (t.figures['width'] ?? Infinity) <= widest,
    )
    .sort((a, b) => (a.figures['width'] ?? 0) - (b.figures['width'] ?? 0));
  const spec = `parting blade, reach ${words.length(reach)}${widest < Infinity ? `, ${words.length(widest)} wide at most` : ''}`;
  return pick(blades[0], spec, 'Buy one, or let the saw cut the piece off.');
}

export function formTool({ register, words }: Shop, radius: number): Pick {
  const found = register.tools.find(
    (t) => t.kind === 'form' && Math.abs((t.figures['radius'] ?? 0) - radius) <= 0.01,
  );
  if (found) return pick(found, `form tool, hollow R${words.length(radius)}`, '');
  return {
    name: `form tool R${words.length(radius)}, to be ground here`,
    need: alternative(
      'tool',
      `form tool, hollow R${words.length(radius)}`,
      undefined,
      'None in the register: the crown is turned freehand in steps and filed to a radius gauge, or a tool is ground here.',
      [
        `grind a form tool R${words.length(radius)} and try it on scrap`,
        'turn in steps and file to the gauge, 10 min more',
      ],
    ),
  };
}

export function dieFor(register: Register, thread: ThreadFeature): Tool | undefined {
  return register.tools.find(
    (t) =>
      t.kind === 'die' &&
      Math.abs((t.figures['major'] ?? 0) - thread.major) < 0.01 &&
      Math.abs((t.figures['pitch'] ?? 0) - thread.pitch) < 0.002 &&
      (t.figures['hand'] ?? 1) === (thread.hand === 'left' ? -1 : 1),
  );
}

export function dieHolderFor(register: Register, die: Tool): Tool | undefined {
  return register.tools.find(
    (t) =>
      t.kind === 'die-holder' && Math.abs((t.figures['outside'] ?? 0) - (die.figures['outside'] ?? 0)) < 0.5,
  );
}

export function threadingTool(register: Register, thread: ThreadFeature): Pick {
  const degrees = /^(BSW|BSF|G)/i.test(thread.designation) ? 55 : /^Tr/i.test(thread.designation) ? 30 : 60;
  const found = register.tools.find((t) => t.kind === 'threading' && (t.figures['angle'] ?? 60) === degrees);
  return pick(found, `threading tool ${degrees}°`, 'Buy or grind one to a centre gauge.');
}

/** True where the lathe's gearbox cuts the lead. */
export function gearboxCuts(lathe: Lathe, lead: number): boolean {
  return (
    lathe.pitches.some((p) => Math.abs(p - lead) < 1e-6) ||
    lathe.threadsPerInch.some((n) => Math.abs(25.4 / n - lead) < 1e-6)
  );
}

/** The centre drill of this pilot size. */
export function centreDrill(register: Register, pilot: number, designation: string): Pick {
  const found = register.tools.find(
    (t) => t.kind === 'centre-drill' && Math.abs((t.figures['diameter'] ?? 0) - pilot) < 0.01,
  );
  return pick(found, `centre drill ${designation}`, 'Buy one; they are cheap.');
}

/** The largest end mill, which is the stiffest; at least as wide as the face where one is. */
export function endMill({ register, words }: Shop, faceWidth: number): Pick {
  const mills = register.tools
    .filter((t) => t.kind === 'end-mill')
    .sort((a, b) => (a.figures['diameter'] ?? 0) - (b.figures['diameter'] ?? 0));
  const found = mills.find((t) => (t.figures['diameter'] ?? 0) > faceWidth) ?? mills[mills.length - 1];
  return pick(found, `end mill, over ${words.length(faceWidth)} wide if it can be had`, 'Buy one.');
}

export interface Hold {
  item: Chuck | ColletSet;
  kind: 'chuck' | 'collet';
  name: string;
  reach: number;
  minutes: number;
  maximumSpeed: number;
}

/** What on this lathe closes on a diameter, best first: a collet on finished work, a chuck on raw bar. */
export function holdsFor(register: Register, lathe: Lathe, diameter: number, finished: boolean): Hold[] {
  const chucks: Hold[] = register.chucks
    .filter((c) => c.machines.includes(lathe.id) && c.minimum <= diameter && diameter <= c.maximum)
    .sort((a, b) => (a.kind === b.kind ? a.maximum - b.maximum : a.kind === 'three-jaw' ? -1 : 1))
    .map((item) => ({
      item,
      kind: 'chuck',
      name: finished ? `${item.name}, soft jaws or copper strip` : item.name,
      reach: item.jawLength,
      minutes: item.kind === 'four-jaw' ? 8 : finished ? 4 : 2,
      maximumSpeed: item.maximumSpeed,
    }));
  const collets: Hold[] = register.colletSets
    .filter((s) => s.machines.includes(lathe.id))
    .flatMap((item) => {
      const size = colletSize(item, diameter);
      if (size === null) return [];
      return [
        {
          item,
          kind: 'collet' as const,
          name: `Collet ${figure(size)}`,
          reach: item.gripLength,
          minutes: 3,
          maximumSpeed: Infinity,
        },
      ];
    });
  return finished ? [...collets, ...chucks] : [...chucks, ...collets];
}

/** The collet that closes on a diameter: its own size, or the next above within its range. */
export function colletSize(set: ColletSet, diameter: number): number | null {
  return set.sizes.find((size) => size >= diameter - 1e-6 && size - diameter <= set.range + 1e-6) ?? null;
}

export interface Indexing {
  name: string;
  item: string;
  text: string;
  minutes: number;
  minutesPerFace: number;
  rule: 'index-block' | 'index-head';
  reach: number;
  need: DraftNeed;
}

/** Turns and holes of a dividing head for N equal parts: 40/N over the first circle that divides it. */
export function dividingTurns(
  ratio: number,
  plates: readonly (readonly number[])[],
  parts: number,
): { turns: number; holes: number; circle: number } | null {
  const turns = Math.floor(ratio / parts + 1e-9);
  const rest = ratio - turns * parts;
  if (Math.abs(rest) < 1e-9) return { turns, holes: 0, circle: 0 };
  for (const circle of plates.flat()) {
    const holes = (rest * circle) / parts;
    if (Math.abs(holes - Math.round(holes)) < 1e-9) return { turns, holes: Math.round(holes), circle };
  }
  return null;
}

/** How the shop turns work from face to face: a block with those faces, else a dividing head, else nothing. */
export function indexingFor({ register, words }: Shop, faces: number, grip: number): Indexing {
  const spec = `index ${faces} faces, held on Ø${words.length(grip)}`;
  const block = register.colletBlocks.find((b) => {
    const set = register.colletSets.find((s) => s.id === b.colletSet);
    return b.faces % faces === 0 && set !== undefined && colletSize(set, grip) !== null;
  });
  if (block) {
    const set = register.colletSets.find((s) => s.id === block.colletSet);
    const size = set ? colletSize(set, grip) : null;
    const step = block.faces / faces;
    return {
      name: `${block.name}, collet ${figure(size ?? grip)}`,
      item: block.id,
      text:
        step === 1
          ? 'Turn the block to its next face in the vice.'
          : `Turn the block ${step} faces on in the vice.`,
      minutes: 6,
      minutesPerFace: 1,
      rule: 'index-block',
      reach: set?.gripLength ?? 25,
      need: held('setting', spec, block.id, `${block.name}, ${block.place}.`),
    };
  }
  for (const head of register.dividingHeads) {
    if (grip < head.minimum || grip > head.maximum) continue;
    const turn = dividingTurns(head.ratio, head.plates, faces);
    if (!turn) continue;
    const whole =
      turn.holes === 0
        ? `${turn.turns} turns`
        : `${turn.turns} turns and ${turn.holes} holes of ${turn.circle}`;
    return {
      name: head.name,
      item: head.id,
      text: `Index ${whole} a face: ${figure(head.ratio)}/${faces}.`,
      minutes: 12,
      minutesPerFace: 1.5,
      rule: 'index-head',
      reach: 30,
      need: held('setting', spec, head.id, `${head.name}: ${whole} a face.`),
    };
  }
  return {
    name: 'dividing head',
    item: '',
    text: `Index by ${figure(360 / faces)}° a face.`,
    minutes: 12,
    minutesPerFace: 2,
    rule: 'index-head',
    reach: 30,
    need: short('setting', spec, 'No block has these faces and no head’s plates divide them.', [
      `buy a collet block with ${faces} faces or a plate that divides them`,
    ]),
  };
}

/** The machine's nearest speed not above the wanted; its slowest when all are above. */
export function nearestSpeed(speeds: readonly number[], wanted: number): number {
  const sorted = [...speeds].sort((a, b) => a - b);
  let found = sorted[0] ?? 0;
  for (const speed of sorted) if (speed <= wanted + 1e-9) found = speed;
  return found;
}

/** The machine's nearest feed not above the wanted; the wanted itself where the register gives it none. */
export function nearestFeed(feeds: readonly number[], wanted: number): number {
  return feeds.length === 0 ? wanted : nearestSpeed(feeds, wanted);
}

export function firstMill(register: Register): Mill | null {
  return register.mills[0] ?? null;
}
