import { describe, expect, it } from 'vitest';
import { simulate } from '../../shared/simulate/simulate';
import { handleRoute, shaftRoute } from '../unit/simulate/hand-made';
import { SABOTAGES } from './sabotage';

const MADE = { shaft: shaftRoute(), handle: handleRoute() };

describe.each(Object.entries(MADE))('a %s route spoiled', (_name, { route, part }) => {
  it.each(SABOTAGES.map((sabotage) => [sabotage.id, sabotage] as const))('%s is refused', (_id, sabotage) => {
    const missed: string[] = [];
    for (const spoiled of sabotage.mutations(route, part)) {
      const rules = simulate(spoiled.route, part).map((fault) => fault.rule);
      const caught =
        sabotage.expected.length === 0
          ? rules.length > 0
          : sabotage.expected.some((rule) => rules.includes(rule));
      if (!caught) missed.push(`${spoiled.text}: ${rules.join(', ') || 'accepted'}`);
    }
    expect(missed).toEqual([]);
  });
});

it('each sabotage has something to spoil on one of the routes', () => {
  const idle = SABOTAGES.filter((sabotage) =>
    Object.values(MADE).every(({ route, part }) => sabotage.mutations(route, part).length === 0),
  );
  expect(idle.map((sabotage) => sabotage.id)).toEqual([]);
});
