import { expect, test } from 'vitest';
import { nextPauseMs } from '@/src/ops/backoff.mjs';

test('pauses grow from 0.2 s to 5 s and begin anew after 30 s of life', () => {
  const pausesMs: number[] = [];
  for (let death = 0; death < 7; death += 1) pausesMs.push(nextPauseMs(pausesMs.at(-1), 100));
  expect(pausesMs).toEqual([200, 400, 800, 1600, 3200, 5000, 5000]);
  expect(nextPauseMs(5000, 30_000)).toBe(200);
});
