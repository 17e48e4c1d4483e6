import { describe, expect, it } from 'vitest';
import { binarySection, equilibrium } from '#shared/metallurgy/index.ts';

// Near an invariant two sets of phases have all but the same energy: the hardest place for a solver to decide.
describe('within a degree and a millionth of a degree of the Ag-Cu eutectic', () => {
  const section = binarySection({ kind: 'binary', elements: ['Ag', 'Cu'] });
  const eutecticC = section.withinModel ? (section.invariants[0]?.temperatureC ?? 0) : 0;

  for (const silver of [92, 85, 75, 71.59, 65, 60, 50, 30, 10]) {
    it(`answers on either side for Ag ${silver}`, () => {
      for (let exponent = 0; exponent >= -6; exponent--) {
        for (const side of [-1, 1]) {
          const state = equilibrium({ Ag: silver, Cu: 100 - silver }, eutecticC + side * 10 ** exponent);
          if (!state.withinModel) throw new Error(state.reason);
          if (exponent < -3) continue;
          const liquid = state.phases.some((phase) => phase.name === 'liquid');
          expect(liquid).toBe(side > 0 && silver < 91.5 && silver > 7.5);
        }
      }
    });
  }
});
