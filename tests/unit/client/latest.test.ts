import { describe, expect, it } from 'vitest';
import { Latest } from '../../../src/engine/latest';

describe('the queue before the engine', () => {
  it('runs one job at a time and of those that wait only the newest', () => {
    const run: number[] = [];
    const queue = new Latest<number>((job) => run.push(job));
    for (const job of [1, 2, 3, 4]) queue.submit(job);
    expect(run).toEqual([1]);
    expect(queue.finished()).toBe(true);
    expect(run).toEqual([1, 4]);
    expect(queue.finished()).toBe(false);
    queue.submit(5);
    expect(run).toEqual([1, 4, 5]);
  });
});
