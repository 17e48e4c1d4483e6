import { describe, expect, it } from 'vitest';
import { diagramFrame, diagramScales } from './section-diagram-frame.ts';
import { labelPlaces } from './section-diagram-labels.ts';

const frame = diagramFrame(880);
const scales = diagramScales(frame, { xMin: 0, xMax: 100, lowC: 600, highC: 1100 });
const box = (x0: number, x1: number, low: number, high: number) => [
  { x: x0, temperatureC: low },
  { x: x1, temperatureC: low },
  { x: x1, temperatureC: high },
  { x: x0, temperatureC: high },
];
const places = (
  outline: ReturnType<typeof box>,
  words: string,
  clear: { left: number; right: number }[] = [],
) =>
  labelPlaces(
    [
      { words: 'liquid', outline: box(0, 100, 900, 1100) },
      { words, outline },
    ],
    scales,
    frame,
    clear,
    [18, 16, 14, 13],
  );

describe('labelPlaces', () => {
  it('puts words in the middle of a roomy field', () => {
    const [, place] = places(box(20, 80, 620, 880), 'solid');
    expect(place?.size).toBe(18);
    expect(place?.x).toBeCloseTo(scales.x(50), -1);
    expect(place?.y).toBeCloseTo(scales.y(750), -1);
  });

  it('stands words on end in a field that is high and narrow', () => {
    const [, place] = places(box(0, 6, 620, 880), 'silver, solid');
    expect(place?.upright).toBe(true);
  });

  it('calls out a field too thin for its words, from the field over it', () => {
    const [, place] = places(box(20, 80, 890, 900), 'solid + liquid');
    expect(place?.leader?.y).toBeGreaterThan(scales.y(900));
    expect(place?.y).toBeLessThan(scales.y(900));
  });

  it('keeps off the alloy’s own line', () => {
    const middle = scales.x(50);
    const [liquid] = places(box(0, 100, 600, 900), 'solid', [{ left: middle - 14, right: middle + 14 }]);
    const half = 'liquid'.length * 18 * 0.25;
    expect(Math.abs((liquid?.x ?? middle) - middle)).toBeGreaterThan(half);
  });
});
