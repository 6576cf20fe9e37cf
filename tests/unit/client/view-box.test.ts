import { describe, expect, it } from 'vitest';
import { centredOn, moved, scaled } from '../../../src/components/sheet/view-box';

const whole = { x: 0, y: 0, width: 297, height: 210 };

describe('what is seen of a sheet', () => {
  it('comes closer about a point that stays where it is', () => {
    const about = { x: 100, y: 50 };
    const box = scaled(whole, whole, 2, about);
    expect(box.width).toBeCloseTo(148.5);
    expect((about.x - box.x) / box.width).toBeCloseTo(100 / 297);
    expect((about.y - box.y) / box.height).toBeCloseTo(50 / 210);
  });

  it('never goes further than the whole sheet nor off its edge', () => {
    expect(scaled(whole, whole, 0.5, { x: 10, y: 10 })).toEqual(whole);
    const close = scaled(whole, whole, 4, { x: 0, y: 0 });
    expect(moved(close, whole, -500, -500)).toMatchObject({ x: 0, y: 0 });
    expect(moved(close, whole, 5000, 0).x).toBeCloseTo(297 - close.width);
  });

  it('shows a point in the middle where the sheet allows it', () => {
    const box = centredOn(whole, { x: 150, y: 100 }, 100, 2);
    expect(box).toEqual({ x: 100, y: 75, width: 100, height: 50 });
    expect(centredOn(whole, { x: 5, y: 5 }, 100, 2)).toMatchObject({ x: 0, y: 0 });
  });
});
