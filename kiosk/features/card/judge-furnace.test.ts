import { describe, expect, it } from 'vitest';
import { judgeFurnace } from './judge-furnace.ts';

describe('judgeFurnace', () => {
  it('takes what lies near the card', () => {
    expect(judgeFurnace(548, 'C', 545, 1400)).toEqual({ kind: 'accept', celsius: 548 });
  });

  it('asks whether the other unit was meant when that fits and this does not', () => {
    expect(judgeFurnace(1013, 'C', 545, 1400)).toMatchObject({ kind: 'refuse', meant: { label: '1013 °F' } });
  });

  it('questions what is possible but far off, refuses what is not possible', () => {
    expect(judgeFurnace(700, 'C', 545, 1400)).toMatchObject({ kind: 'question', celsius: 700 });
    expect(judgeFurnace(5450, 'C', 545, 1400)).toMatchObject({ kind: 'refuse', meant: null });
  });
});
