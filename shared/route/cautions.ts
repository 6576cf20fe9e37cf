import type { DraftOperation } from './draft';
import type { Register } from './register';

/** On every card, whatever the work. */
export const STANDING_CAUTIONS: readonly string[] = [
  'The machine’s manual, the shop’s rules and local codes come first.',
  'Sizes are not checked for strength: a competent person decides whether the part may carry people, loads or pressure.',
];

/** The usual cautions of an operation (common practice), the weightiest first; a first setting says the shop’s own. */
export function cautionsFor(
  operation: DraftOperation,
  register: Register,
  first: boolean,
  spindleEnd: number,
): string[] {
  const cautions: string[] = [];
  switch (operation.method) {
    case 'saw':
      cautions.push('Guard down to the work; the offcut is hot and sharp.');
      break;
    case 'grip':
    case 'turn-round':
      cautions.push('Chuck key out before the switch. No sleeves, no gloves, eyes covered.');
      if (spindleEnd > 150)
        cautions.push(
          'Bar stands out behind the spindle: support it, and keep the speed down until it runs quietly.',
        );
      break;
    case 'face':
      if (operation.key.endsWith('.trim'))
        cautions.push('The end stands free once the centre is drawn back: light cuts, no parting tool here.');
      break;
    case 'taper-turn':
      cautions.push('Lock the carriage. The tail must clear the tool at the small end.');
      break;
    case 'part-off':
      cautions.push('Stop if it chatters; catch the piece, do not reach for it.');
      break;
    case 'thread-die':
      cautions.push('Lowest speed or by hand; hands off the holder’s arm.');
      break;
    case 'thread-single-point':
      cautions.push('Know where the half nuts open before the first pass.');
      break;
    case 'mill-flat':
      cautions.push('Clear of the cutter by hand before the work is turned. Brush the swarf, never fingers.');
      break;
    case 'form-turn':
      cautions.push('A wide edge digs in: slow, by hand, little at a time.');
      break;
    case 'rough-turn':
      cautions.push('Swarf comes off long and sharp: a hook, never a hand.');
      break;
    case 'deburr':
      cautions.push('On the bench, not in the chuck turning; a handle on the file.');
      break;
    default:
      break;
  }
  const own = register.tools.find((tool) => tool.id === operation.toolItem)?.caution;
  if (own) cautions.push(own);
  else if (operation.tool.includes('ground here'))
    cautions.push('Ground here: look at its edge, and try it on scrap.');
  if (first) cautions.push(...STANDING_CAUTIONS);
  return cautions;
}
