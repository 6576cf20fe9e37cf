import { describe, expect, it } from 'vitest';
import { simulate } from '../../../shared/simulate/simulate';
import { mirrorBody, mirrorPart, mirrorRemoval } from '../../../shared/part/mirror';
import type { Route } from '../../../shared/route/route';
import { restate } from '../../property/sabotage';
import { handleRoute, shaftRoute } from './hand-made';

/** The same work turned end for end: left for right in every place a route speaks of them. */
function turned(route: Route, length: number): Route {
  const face = (id: string): string => ({ 'left-face': 'right-face', 'right-face': 'left-face' })[id] ?? id;
  const end = <E extends string>(which: E): E =>
    (({ left: 'right', right: 'left' })[which as string] ?? which) as E;
  return {
    ...route,
    blank: mirrorBody(route.blank, length),
    setups: route.setups.map((setup) => ({
      ...setup,
      freeEnd: end(setup.freeEnd),
      gripFrom: length - setup.gripTo,
      gripTo: length - setup.gripFrom,
    })),
    operations: route.operations.map((operation) => ({
      ...operation,
      end: end(operation.end),
      features: operation.features.map(face),
      cut: operation.cut && mirrorRemoval(operation.cut, length),
      stops: operation.stops.map((stop) => ({
        ...stop,
        from: face(stop.from),
        fromX: length - stop.fromX,
        toX: length - stop.toX,
      })),
    })),
  };
}

describe('routes made by hand', () => {
  it('accepts a threaded shaft worked from the bar and turned round', () => {
    const { route, part } = shaftRoute();
    expect(simulate(route, part)).toEqual([]);
  });
  it('accepts a hexagon handle with taper and crown', () => {
    const { route, part } = handleRoute();
    expect(simulate(route, part)).toEqual([]);
  });
  it.each([
    ['shaft', shaftRoute()],
    ['handle', handleRoute()],
  ])('accepts the %s turned end for end, and only for the part turned with it', (_name, { route, part }) => {
    const other = restate(turned(route, part.length), mirrorPart(part));
    expect(simulate(other, mirrorPart(part))).toEqual([]);
    expect(simulate(other, part).map((fault) => fault.rule)).toContain('stage-is-part');
  });
});
