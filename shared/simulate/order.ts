import type { Fault, Method, Operation, Route } from '../route/route';
import { RULES } from '../route/rules';
import { fault } from './fault';
import { EVENTS } from './replay';

/** Order of what leaves no trace in the metal: set-ups, edges of precedence, marking, indicating, edges, checks. */
export function judgeOrder(route: Route): Fault[] {
  return [...edgeFaults(route), ...setUpFaults(route), ...eventFaults(route)];
}

function edgeFaults(route: Route): Fault[] {
  const faults: Fault[] = [];
  const numbers = new Set(route.operations.map((operation) => operation.number));
  for (const operation of route.operations) {
    for (const edge of operation.after) {
      if (!numbers.has(edge.operation) || edge.operation >= operation.number)
        faults.push(
          fault(
            'waits-for-earlier',
            operation.number,
            `It waits for operation ${edge.operation}, which does not come before it.`,
          ),
        );
      if (!(edge.rule in RULES))
        faults.push(fault('waits-for-earlier', operation.number, `${edge.rule} is no rule of the trade.`));
    }
    for (const reason of operation.reasons)
      if (!(reason in RULES))
        faults.push(fault('waits-for-earlier', operation.number, `${reason} is no rule of the trade.`));
  }
  return faults;
}

function setUpFaults(route: Route): Fault[] {
  const faults: Fault[] = [];
  const seen = new Set<string>();
  let current = '';
  for (const operation of route.operations) {
    if (operation.setup === current) continue;
    if (seen.has(operation.setup))
      faults.push(
        fault(
          'set-up-whole',
          operation.number,
          `Set-up ${operation.setup} was broken down and is gone back to.`,
        ),
      );
    seen.add(operation.setup);
    current = operation.setup;
  }
  for (const setup of route.setups) {
    const within = route.operations.filter((operation) => operation.setup === setup.id);
    const held = within.filter((operation) => !EVENTS.has(operation.method) && operation.method !== 'saw');
    const first = held[0];
    if (!first) continue;
    const opening = within.find((operation) => operation.method !== 'saw');
    if (opening && opening.method !== 'grip' && opening.method !== 'turn-round')
      faults.push(fault('grip-first', opening.number, `Set-up ${setup.id} begins before the work is held.`));
    const indicated = within.find((operation) => operation.method === 'indicate');
    if (indicated && indicated.number > first.number)
      faults.push(fault('indicate-before-cut', first.number, 'The work is cut before it is set true.'));
  }
  return faults;
}

function eventFaults(route: Route): Fault[] {
  const faults: Fault[] = [];
  const all = route.operations;
  const last = all[all.length - 1];
  const cuts = all.filter((operation) => !EVENTS.has(operation.method));
  const lastCut = cuts[cuts.length - 1];
  const findLast = (method: Method): Operation | undefined =>
    [...all].reverse().find((operation) => operation.method === method);
  if (last && last.method !== 'inspect')
    faults.push(
      fault(
        'inspect-last',
        last.number,
        'The finished part is not measured after everything that could change it.',
      ),
    );
  const edges = findLast('deburr');
  if (lastCut && (!edges || edges.number < lastCut.number))
    faults.push(fault('edges-last', lastCut.number, 'Edges are not broken after the last cut.'));
  const fitted = findLast('fit-check');
  const threaded = cuts
    .filter((operation) => operation.method.startsWith('thread-') || operation.method === 'tap')
    .pop();
  if (threaded && fitted && fitted.number < threaded.number)
    faults.push(
      fault('fit-before-inspect', fitted.number, 'The thread is tried in its mate before it is cut.'),
    );
  if (edges && fitted && fitted.number < edges.number)
    faults.push(
      fault(
        'fit-before-inspect',
        fitted.number,
        'The thread is tried in its mate before its burrs are gone.',
      ),
    );
  if (threaded && !fitted)
    faults.push(
      fault('fit-before-inspect', threaded.number, 'The thread is never tried in its mate or gauge.'),
    );
  faults.push(...measuringFaults(route, last, edges));
  for (const saw of all.filter((operation) => operation.method === 'saw' && !operation.cut))
    if (all.some((operation) => operation.number < saw.number && operation.method !== 'saw'))
      faults.push(
        fault('saw-first', saw.number, 'The piece is sawn from the bar after work on it has begun.'),
      );
  for (const milled of all.filter((operation) => operation.method === 'mill-flat')) {
    const marked = all.find(
      (each) => each.method === 'mark-out' && each.features.some((id) => milled.features.includes(id)),
    );
    if (marked && marked.number > milled.number)
      faults.push(
        fault('mark-before-mill', milled.number, 'The flats are milled before they are marked out.'),
      );
  }
  return faults;
}

/** Measuring in the machine: of what is cut by then, while it is still held. The last inspection is at the bench. */
function measuringFaults(route: Route, last: Operation | undefined, edges: Operation | undefined): Fault[] {
  const faults: Fault[] = [];
  const all = route.operations;
  for (const measured of all.filter((operation) => operation.method === 'inspect' && operation !== last)) {
    const { number, setup } = measured;
    if (edges && edges.number < number)
      faults.push(
        fault(
          'edges-last',
          edges.number,
          'Edges are broken while the work is still to be measured in the machine.',
        ),
      );
    const parted = all.find((operation) => operation.setup === setup && operation.method === 'part-off');
    if (parted && parted.number < number && parted.cut?.kind === 'sever')
      faults.push(
        fault('part-last', number, 'The work has been cut off before it is measured in the machine.'),
      );
    const toCome = all.find(
      (operation) =>
        operation.number > number &&
        operation.setup === setup &&
        operation.cut &&
        operation.method !== 'rough-turn' &&
        operation.features.some((id) => measured.features.includes(id)),
    );
    if (toCome)
      faults.push(
        fault('inspect-last', number, `It measures what operation ${toCome.number} has still to cut.`),
      );
  }
  return faults;
}
