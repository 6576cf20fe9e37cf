import { describe, expect, it } from 'vitest';
import { simulate } from '../../../shared/simulate/simulate';
import { handleRoute, shaftRoute } from './hand-made';

describe('routes made by hand', () => {
  it('accepts a threaded shaft worked from the bar and turned round', () => {
    const { route, part } = shaftRoute();
    expect(simulate(route, part)).toEqual([]);
  });
  it('accepts a hexagon handle with taper and crown', () => {
    const { route, part } = handleRoute();
    expect(simulate(route, part)).toEqual([]);
  });
});
