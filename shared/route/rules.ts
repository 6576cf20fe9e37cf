/**
 * The trade's named limits and rules: the only table that the planner and the simulator share.
 * A limit is a figure; a rule is a reason why one thing comes before another or must hold.
 * Judgement figures are marked so: they are chosen, not calibrated, and a shop may differ.
 */
export interface Limit {
  id: string;
  value: number;
  unit: 'mm' | 'N/mm' | 'N/mm²' | 'ratio' | 'deg' | 'pitch' | 'mm³';
  reason: string;
  source: string;
}

export interface Rule {
  id: string;
  reason: string;
  source: string;
}

const PRACTICE = 'common practice';
const JUDGEMENT = 'common practice (judgement figure)';

function limit(id: string, value: number, unit: Limit['unit'], reason: string, source = PRACTICE): Limit {
  return { id, value, unit, reason, source };
}

export const LIMITS = {
  gripMinimum: limit(
    'grip-minimum',
    5,
    'mm',
    'Jaws or a collet need this much of a plain cylinder to hold at all.',
    JUDGEMENT,
  ),
  gripMost: limit(
    'grip-most',
    60,
    'mm',
    'Longest length of work that jaws or a collet really close on; more is bar in the spindle, not a grip.',
    JUDGEMENT,
  ),
  gripRatio: limit(
    'grip-ratio',
    0.35,
    'ratio',
    'A grip shorter than this share of its diameter lets the work rock; the longer of this and the least grip rules.',
    JUDGEMENT,
  ),
  gripLeverage: limit(
    'grip-leverage',
    8,
    'ratio',
    'Free length over the length gripped, above which work rocks in the jaws: another holding is looked for first.',
    JUDGEMENT,
  ),
  partingClear: limit(
    'parting-clear',
    3,
    'mm',
    'Least distance between the jaws and the near side of the parting blade.',
    JUDGEMENT,
  ),
  partingMost: limit(
    'parting-most',
    40,
    'mm',
    'Diameter above which parting a solid on a small lathe is looked on as a last resort; the saw does it better.',
    JUDGEMENT,
  ),
  overhang: limit(
    'overhang',
    3,
    'ratio',
    'Free length from the hold to the far end of the cut, over the smallest diameter between them on the stage before the cut: above this the work wants a centre or a steady.',
  ),
  slender: limit(
    'slender',
    10,
    'ratio',
    'Free length over the smallest diameter above which a centre alone is not enough for a heavy cut: light cuts, a steady, or between centres.',
  ),
  lightDepth: limit(
    'light-depth',
    0.25,
    'mm',
    'Largest radial depth of a light cut: all that is taken on work that stands out too far with nothing at its end.',
    JUDGEMENT,
  ),
  forcePerDepth: limit(
    'force-per-depth',
    240,
    'N/mm',
    'Cutting force sideways for each millimetre of radial depth at a usual feed in mild steel.',
    JUDGEMENT,
  ),
  elasticModulus: limit(
    'elastic-modulus',
    205_000,
    'N/mm²',
    'Stiffness of steel; used for every material, since softer metals also cut lighter.',
    'from memory',
  ),
  bendRough: limit(
    'bend-rough',
    0.3,
    'mm',
    'Most that the work may bend under a roughing cut (depth over the light depth).',
    JUDGEMENT,
  ),
  bendFinish: limit(
    'bend-finish',
    0.1,
    'mm',
    'Most that the work may bend under a light, finishing cut.',
    JUDGEMENT,
  ),
  tailFactor: limit(
    'tail-factor',
    0.1,
    'ratio',
    'Share of the free bending that is left when a centre stands in the end.',
    JUDGEMENT,
  ),
  roughAllowance: limit(
    'rough-allowance',
    0.25,
    'mm',
    'Metal a side that roughing leaves for the finishing cut: one light cut.',
  ),
  roughDepth: limit(
    'rough-depth',
    1.5,
    'mm',
    'Usual radial depth of a roughing pass on a small lathe in steel.',
    JUDGEMENT,
  ),
  faceAllowance: limit('face-allowance', 1, 'mm', 'Metal left at a sawn or parted end to face off.'),
  partedAllowance: limit(
    'parted-allowance',
    0.5,
    'mm',
    'Extra length left when a parted end is faced afterwards.',
  ),
  millDepth: limit(
    'mill-depth',
    2,
    'mm',
    'Usual depth of one cut of an end mill across a flat on a small mill.',
    JUDGEMENT,
  ),
  centreTrim: limit(
    'centre-trim',
    1,
    'mm',
    'Metal left behind a centre hole that is cut away afterwards, so that nothing of it reaches the part.',
    JUDGEMENT,
  ),
  slideOverlap: limit(
    'slide-overlap',
    3,
    'mm',
    'Length by which two settings of the top slide on one taper overlap, so that the blend can be seen.',
  ),
  toolRunOff: limit('tool-run-off', 2, 'mm', 'The tool starts this far off the end of the work.'),
  overRun: limit(
    'over-run',
    3,
    'mm',
    'Flats are milled this far past where the drawing ends them when the taper cut later trims them.',
    JUDGEMENT,
  ),
  reamLeast: limit('ream-least', 0.05, 'mm', 'Least metal a side for a reamer to cut rather than rub.'),
  reamMost: limit('ream-most', 0.4, 'mm', 'Most metal a side that a reamer takes.'),
  threadExit: limit(
    'thread-exit',
    1,
    'pitch',
    'A single-point tool needs at least this many pitches of run-out or relief before a shoulder.',
  ),
  dieLead: limit(
    'die-lead',
    2,
    'pitch',
    'A die leaves about this many imperfect threads at a shoulder; turned round, about one.',
  ),
  collarClear: limit(
    'collar-clear',
    0.5,
    'mm',
    'Clearance between a tool and a collar beside its path.',
    JUDGEMENT,
  ),
  figureTolerance: limit(
    'figure-tolerance',
    0.005,
    'mm',
    'A declared length, depth or stop may differ from the metal by no more than this.',
  ),
  angleTolerance: limit(
    'angle-tolerance',
    0.005,
    'deg',
    'A declared half angle may differ from the cone by no more than this.',
  ),
  sameMetal: limit('same-metal', 1e-6, 'mm', 'Two stations or radii closer than this are one.'),
  volumeTolerance: limit(
    'volume-tolerance',
    1e-6,
    'ratio',
    'Volumes must balance to this share of the blank.',
  ),
  mouthOfJaw: limit(
    'jaw-reach',
    40,
    'mm',
    'Length of work that jaws can cover when the register does not say.',
    JUDGEMENT,
  ),
} as const satisfies Record<string, Limit>;

/**
 * Methods that push sideways along the work: judged by the overhang ratio (unless a centre or a steady stands in)
 * and by the bend under their own depth of cut. The light ones below are judged by the bend alone; all but
 * facing, which pushes mostly along the axis, take no more than the light depth where the overhang ratio is exceeded. The rest (marking, measuring, tapping,
 * dies, which push along the axis or follow the work) are not judged by either.
 */
export const SIDE_METHODS = [
  'rough-turn', 'turn', 'taper-turn', 'groove', 'knurl', 'thread-single-point', 'mill-flat', 'mill-key',
] as const; // prettier-ignore
export const LIGHT_METHODS = ['face', 'form-turn', 'chamfer'] as const;

/*
 * Conventions that planner and simulator both keep:
 * - in a set-up whose support is `centre` the tail stands in the free end as soon as there is a hole to enter (drilled
 *   in this set-up or an earlier one) and until a cut takes the hole away; it is out for facing, end forms and dies;
 * - free length runs from the grip's edge on the free side to the far end of the cut; the smallest diameter is that of
 *   the stage before the cut, flats counted across them, over that length (but for the chamfer at the tip of a thread);
 * - the bend is F / E · ∫ (xc − x)² / I dx over that length on the same stage, xc the far end of the cut,
 *   I = π (r⁴ − b⁴) / 4 with r held to a flat's distance, F = forcePerDepth × depthOfCut; × tailFactor with a centre;
 * - passes × depthOfCut is at least the metal gone: radially for turning, along the axis for facing, square to the
 *   face for a flat.
 */

export type LimitName = keyof typeof LIMITS;

function rule(id: string, reason: string, source = PRACTICE): Rule {
  return { id, reason, source };
}

export const RULES = {
  // what comes before what
  'datum-first': rule('datum-first', 'The end is faced before any length is measured from it.'),
  'face-before-centre': rule(
    'face-before-centre',
    'A centre drill wanders on a sawn end, so the end is faced first.',
  ),
  'centre-before-support': rule('centre-before-support', 'The tail centre needs a hole to enter.'),
  'rough-large-first': rule(
    'rough-large-first',
    'The largest diameter is roughed first, so that the bar stays stiff towards the chuck.',
  ),
  'rough-before-finish': rule(
    'rough-before-finish',
    'All roughing in a setting is done before any finished surface: heat and force move the work.',
  ),
  'row-before-chamfer': rule(
    'row-before-chamfer',
    'A chamfer is measured from the finished cylinder and face.',
  ),
  'row-before-groove': rule('row-before-groove', 'A groove is measured from the finished cylinder.'),
  'blank-before-thread': rule(
    'blank-before-thread',
    'The cylinder is at its blank size before the thread is cut on it.',
  ),
  'chamfer-before-thread': rule(
    'chamfer-before-thread',
    'The thread needs a lead, and cuts away the burr of the chamfer.',
  ),
  'relief-before-thread': rule(
    'relief-before-thread',
    'Relief, or the smaller neighbour at the exit, is there before the thread runs into it.',
  ),
  'turn-before-mill': rule('turn-before-mill', 'Flats are set from the turned round and the faced end.'),
  'mark-before-mill': rule(
    'mark-before-mill',
    'The ends of the flats are marked out in blue before the cutter comes near.',
  ),
  'flats-before-taper': rule(
    'flats-before-taper',
    'Flats run on past their length and the taper cut trims their ends clean.',
  ),
  'taper-before-crown': rule('taper-before-crown', 'The crown meets the finished taper.'),
  'support-before-trim': rule(
    'support-before-trim',
    'All that leans on the tail centre is done before the length with its hole is cut away.',
  ),
  'trim-before-end-form': rule(
    'trim-before-end-form',
    'The end is to length before its crown or chamfer is cut.',
  ),
  'part-last': rule('part-last', 'Work stays on the bar until everything that the bar can hold is done.'),
  'turn-round': rule('turn-round', 'Everything at the first end is done before the work is turned round.'),
  'set-up-whole': rule('set-up-whole', 'A setting that has been broken down is not gone back to.'),
  'grip-first': rule('grip-first', 'The work is held before it is cut.'),
  'saw-first': rule('saw-first', 'The piece is cut from the bar before it is held.'),
  'indicate-before-cut': rule('indicate-before-cut', 'Work turned round is set true before it is cut.'),
  'edges-last': rule('edges-last', 'Edges are broken when no more cutting will raise a burr.'),
  'fit-before-inspect': rule(
    'fit-before-inspect',
    'The thread is tried in its mate or gauge before the part is signed off.',
  ),
  'inspect-last': rule(
    'inspect-last',
    'The finished part is measured after everything that could change it.',
  ),
  'spot-before-drill': rule('spot-before-drill', 'A drill starts true in a spotted centre.'),
  'drill-before-bore': rule('drill-before-bore', 'A boring bar needs a hole to enter.'),
  'bore-before-ream': rule('bore-before-ream', 'A reamer follows the hole it gets.'),
  'mouth-chamfer-before-tap': rule('mouth-chamfer-before-tap', 'A tap needs a lead at the mouth.'),
  'before-hole': rule('before-hole', 'A tap follows the drilled hole.'),
  'blank-before-knurl': rule('blank-before-knurl', 'The cylinder is at the size that closes the knurl.'),
  'knurl-before-fit': rule(
    'knurl-before-fit',
    'Knurl wheels push the work off its axis, so fits are finished after them.',
  ),
  'thread-before-cross-cut': rule(
    'thread-before-cross-cut',
    'A thread or finish bore is cut before anything that would make its tool jump.',
  ),
  'all-pieces-through': rule(
    'all-pieces-through',
    'Every piece of the batch goes through a setting (an angle, an index) before it is broken down.',
  ),
  // what must hold
  'grip-metal': rule('grip-metal', 'The jaws close on metal that is there.'),
  'grip-plain': rule(
    'grip-plain',
    'The jaws close on one plain cylinder: no thread, knurl, key seat, hole or milled flat.',
  ),
  'grip-polygon': rule(
    'grip-polygon',
    'Three jaws, padded, may close on a polygon whose faces they divide, along its whole length, when no round is left to hold.',
  ),
  'grip-length': rule('grip-length', 'The grip is long enough for its diameter.'),
  'grip-behind': rule(
    'grip-behind',
    'Nothing larger stands behind the jaws than can pass them and the spindle.',
  ),
  'grip-uncut': rule('grip-uncut', 'Nothing is cut where the jaws hold.'),
  'free-end-only': rule('free-end-only', 'A set-up works the free end only.'),
  'parting-clear': rule('parting-clear', 'The blade passes clear of the jaws.'),
  'support-overhang': rule(
    'support-overhang',
    'Work that stands out more than three of its smallest diameters is supported.',
  ),
  'support-bend': rule('support-bend', 'The work bends no more than its limit under the cut.'),
  'way-in': rule('way-in', 'The tool reaches its cut from the free end, between the collars beside it.'),
  'thread-run-out': rule('thread-run-out', 'A single-point thread needs a relief or a run-out to stop in.'),
  'stop-from-face': rule('stop-from-face', 'A stop starts at a face that is there now.'),
  'figures-fit': rule('figures-fit', 'Depth, angle, faces, passes and stops agree with the metal.'),
  'removes-metal': rule('removes-metal', 'A cut removes metal, and as much as it says.'),
  'not-below-part': rule('not-below-part', 'No operation cuts into the finished part.'),
  'can-be-replayed': rule(
    'can-be-replayed',
    'Every cut is data that a body can take, in the order of the operations’ numbers.',
  ),
  'stages-recorded': rule('stages-recorded', 'The recorded stages are what the cuts leave.'),
  'named-features': rule('named-features', 'Each operation names the features whose metal it changes.'),
  'waits-for-earlier': rule('waits-for-earlier', 'What an operation waits for has a smaller number.'),
  'finished-once': rule('finished-once', 'Each feature is finished once.'),
  'stage-is-part': rule('stage-is-part', 'What is left at the end is the part.'),
  'volumes-balance': rule('volumes-balance', 'Blank = chips + kerf + remnant + part.'),
  'nothing-after-finish': rule(
    'nothing-after-finish',
    'Nothing is turned into a finished thread or knurl, and nothing is roughed after it is finished.',
  ),
  // choice of stock, blank, method
  'smallest-bar': rule(
    'smallest-bar',
    'The smallest bar in the rack that covers the part wastes least metal and time.',
  ),
  'hexagon-bar': rule(
    'hexagon-bar',
    'A hexagon bar serves when its across-flats is the part’s and nothing round outside the hexagon is larger than it.',
  ),
  'as-drawn': rule('as-drawn', 'The bar’s own surface may stay where size and tolerance allow it.'),
  'bar-through-spindle': rule(
    'bar-through-spindle',
    'A bar that passes the spindle is worked from its end and parted last: something to hold is never lacking.',
  ),
  'stick-for-milling': rule(
    'stick-for-milling',
    'A stick with a holding length is sawn when the work goes to the mill between turnings.',
  ),
  'saw-blank': rule(
    'saw-blank',
    'A blank is sawn to length and turned round when it cannot be worked from one end.',
  ),
  'die-when-held': rule('die-when-held', 'A die is quick and true to size for threads the shop cuts by die.'),
  'single-point': rule(
    'single-point',
    'A thread without a die, or over the shop’s limit, is cut with a single-point tool.',
  ),
  'die-blank-under': rule(
    'die-blank-under',
    'A die raises the crest a little, so the blank is turned under the nominal size, within the thread’s limits.',
  ),
  'die-turned-round': rule(
    'die-turned-round',
    'Close to a shoulder the die is turned round for the last threads.',
  ),
  'two-settings': rule(
    'two-settings',
    'A taper longer than the slide’s travel is cut in settings that overlap.',
  ),
  'index-block': rule(
    'index-block',
    'A collet block with as many faces (or a multiple) indexes the flats without a sum.',
  ),
  'index-head': rule('index-head', 'A dividing head indexes any number its plates divide.'),
  'pull-out': rule(
    'pull-out',
    'A long end is faced and centred held short, then pulled out to the tail centre.',
  ),
  'steady-end': rule(
    'steady-end',
    'An end that stands out too far is faced, formed and threaded with a fixed steady beside it.',
  ),
  'light-face': rule('light-face', 'An end that stands out with nothing in it is faced in light cuts.'),
} as const satisfies Record<string, Rule>;

export type RuleId = keyof typeof RULES;

/** The reason of a rule, for a reader. Unknown ids are ours to answer for: throws. */
export function reasonOf(id: string): string {
  const found = (RULES as Record<string, Rule>)[id];
  if (!found) throw new Error(`no rule of the trade is called ${id}`);
  return found.reason;
}
