import { describe, expect, it } from 'vitest';
import { hoursOfDay } from './hours-of-day.ts';

const at = (hour: number): number => hour * 3_600_000;

describe('hoursOfDay', () => {
  it('leaves an hour on either side', () => {
    expect(hoursOfDay([at(6.5), at(17.2)], 0)).toEqual({ from: 5, to: 19 });
  });

  it('is at least ten hours long, drawn out to later first', () => {
    expect(hoursOfDay([at(9.5)], 0)).toEqual({ from: 8, to: 18 });
    expect(hoursOfDay([at(22.5)], 0)).toEqual({ from: 14, to: 24 });
  });

  it('never leaves the day', () => {
    expect(hoursOfDay([at(0.2), at(23.9)], 0)).toEqual({ from: 0, to: 24 });
  });

  it('shows the working day when nothing happens', () => {
    expect(hoursOfDay([], 0)).toEqual({ from: 7, to: 19 });
  });
});
