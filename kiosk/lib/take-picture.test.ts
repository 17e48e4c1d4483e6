import { expect, it } from 'vitest';
import { fitWithin, longestSidePx } from './take-picture.ts';

it.each([
  [
    { width: 4032, height: 3024 },
    { width: 1600, height: 1200 },
  ],
  [
    { width: 3024, height: 4032 },
    { width: 1200, height: 1600 },
  ],
  [
    { width: 640, height: 480 },
    { width: 640, height: 480 },
  ],
  [
    { width: 9000, height: 2 },
    { width: 1600, height: 1 },
  ],
])('scales %o down to %o and never up', (size, fitted) => {
  expect(fitWithin(size, longestSidePx)).toEqual(fitted);
});
