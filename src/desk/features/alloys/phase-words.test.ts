import { describe, expect, it } from 'vitest';
import { equilibrium, meltingRange, type EquilibriumState } from '#shared/metallurgy/index.ts';
import { beamOfState } from './beam-of-state.ts';
import { freedomSentence, phasesSentence } from './phase-words.ts';

const stateOf = (compositionWt: Readonly<Record<string, number>>, celsius: number): EquilibriumState => {
  const state = equilibrium(compositionWt, celsius);
  if (!state.withinModel) throw new Error(state.reason);
  return state;
};

const sterling = { Ag: 92.5, Cu: 7.5 };
const yellow = { Au: 75, Ag: 12.5, Cu: 12.5 };

describe('phasesSentence', () => {
  it.each([
    [sterling, 850, 'Silver-rich solid and liquid.'],
    [sterling, 950, 'All liquid.'],
    [sterling, 790, 'All solid, of one kind.'],
    [sterling, 700, 'Silver-rich solid and copper-rich solid.'],
    [yellow, 890, 'Gold-rich solid and liquid.'],
  ])('says what stands in %o at %d °C', (compositionWt, celsius, sentence) => {
    expect(phasesSentence(stateOf(compositionWt, celsius))).toBe(sentence);
  });
});

describe('freedomSentence', () => {
  // Condensed phase rule, F = C + 1 − P.
  it.each([
    [
      sterling,
      850,
      'Two phases of two metals, so one thing is free: set the temperature and every composition follows.',
    ],
    [
      sterling,
      950,
      'One phase of two metals, so two things are free: the temperature and one part of the composition.',
    ],
    [
      yellow,
      890,
      'Two phases of three metals, so two things are free: set the temperature and one part of one composition, and the rest follows.',
    ],
    [{ Ag: 100 }, 900, 'One phase of one metal, so one thing is free: the temperature alone.'],
  ])('says what is free in %o at %d °C', (compositionWt, celsius, sentence) => {
    expect(freedomSentence(stateOf(compositionWt, celsius))).toBe(sentence);
  });

  it('says that nothing is free where three phases of two metals meet', () => {
    const state = stateOf(sterling, 850);
    const three = { ...state, degreesOfFreedom: 0, phases: [...state.phases, ...state.phases.slice(0, 1)] };
    expect(freedomSentence(three)).toMatch(/^Three phases of two metals, so nothing is free/);
  });
});

describe('beamOfState', () => {
  it('balances solid against liquid on the alloy’s own content: mass times arm is equal', () => {
    const pair = beamOfState(stateOf(sterling, 850), sterling);
    expect(pair?.element).toBe('copper');
    expect(pair?.alloyWt).toBe(7.5);
    const { left, right, alloyWt } = pair ?? expect.fail('no beam');
    expect(left.massFraction * (alloyWt - left.wt)).toBeCloseTo(right.massFraction * (right.wt - alloyWt), 9);
    expect(left.isLiquid).toBe(false);
    expect(right.isLiquid).toBe(true);
  });

  it('takes two solids together against the liquid', () => {
    const nineCarat = { Au: 37.5, Ag: 31.25, Cu: 31.25 };
    const range = meltingRange(nineCarat);
    const state = stateOf(nineCarat, range.withinModel ? range.solidusC + 0.2 : NaN);
    expect(state.phases).toHaveLength(3);
    const { left, right, alloyWt } = beamOfState(state, nineCarat) ?? expect.fail('no beam');
    expect(left.massFraction + right.massFraction).toBeCloseTo(1, 9);
    expect(left.massFraction * (alloyWt - left.wt)).toBeCloseTo(right.massFraction * (right.wt - alloyWt), 9);
  });

  it('weighs one solid against the other below the solvus, and has no beam for a single phase', () => {
    expect(beamOfState(stateOf(sterling, 700), sterling)?.right.words).toBe('copper-rich solid');
    expect(beamOfState(stateOf(sterling, 950), sterling)).toBeNull();
  });
});
