import { expect, it } from 'vitest';
import { timeToPour } from './time-to-pour.ts';

it.each([
  [8, 'in 8 min'],
  [60, 'in 1 h'],
  [163, 'in 2 h 43'],
  [0, 'now'],
  [-12, '12 min late'],
])('says %i minutes as %j', (minutes, words) => {
  expect(timeToPour(new Date(minutes * 60_000).toISOString(), 0)).toBe(words);
});
