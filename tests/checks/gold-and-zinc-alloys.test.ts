import { describe, expect, it } from 'vitest';
import { POINTS } from '#server/cli/assess/points.ts';
import { fitStage, residualsOf, rootMeanSquare, type Residual } from '#server/cli/assess/fit.ts';
import { sanityChecks } from '#server/cli/assess/sanity.ts';
import { STAGES } from '#server/cli/assess/stages.ts';
import { binarySection, equilibrium, meltingRange } from '#shared/metallurgy/index.ts';
import { COMMITTED } from '#shared/metallurgy/model.ts';

const residuals = residualsOf(COMMITTED, POINTS);
const melting = ({ quantity }: Residual): boolean => quantity !== 'solvus';
const stageOf = (id: string): string | undefined => POINTS.find((point) => point.id === id)?.stage;

const rms = (stage: string, uses: readonly string[], keep: (r: Residual) => boolean = melting): number =>
  rootMeanSquare(residuals, (r) => stageOf(r.id) === stage && uses.includes(r.use) && keep(r)).rmsC;

describe(
  'the assessment against published values (sources in docs/assessment/report.md)',
  { timeout: 30_000 },
  () => {
    it('meets its aims for Ag-Au-Cu: 8 °C rms on points used, 10 °C on those held back', () => {
      expect(rms('gold-silver-copper', ['fit'])).toBeLessThan(8);
      expect(rms('gold-silver-copper', ['held-back'])).toBeLessThan(10);
    });

    it('meets its aim for zinc: 15 °C rms on liquidus up to 15 wt% in silver and 10 wt% in gold alloys', () => {
      const inRange = (r: Residual): boolean => {
        const wt = POINTS.find((point) => point.id === r.id)?.wt ?? {};
        return (
          r.quantity === 'liquidus' && (wt['Zn'] ?? 0) <= (wt['Au'] ? 10 : 16) && Object.keys(wt).length > 2
        );
      };
      for (const stage of ['silver-zinc', 'gold-zinc']) {
        expect(rms(stage, ['fit', 'held-back', 'doubtful'], inRange)).toBeLessThan(15);
      }
    });

    it('says of every doubtful value why it is doubted', () => {
      const doubtful = residuals.filter(({ use }) => use === 'doubtful');
      expect(doubtful.length).toBeGreaterThan(0);
      for (const { why } of doubtful) expect(why?.length).toBeGreaterThan(40);
    });

    it('does nothing absurd elsewhere', () => {
      for (const check of sanityChecks(COMMITTED)) expect(check).toMatchObject({ passed: true });
    });

    it('stands at a minimum: moving any parameter by a standard error fits worse', () => {
      const [stage] = STAGES;
      if (!stage) throw new Error('no stage');
      const fit = fitStage(stage, COMMITTED, POINTS);
      const cost = (values: readonly number[]): number => {
        const names = new Set(stage.build(values).map((i) => i.elements.join()));
        const interactions = [
          ...COMMITTED.interactions.filter((i) => !names.has(i.elements.join())),
          ...stage.build(values),
        ];
        const points = POINTS.filter((point) => point.stage === stage.name);
        return residualsOf({ ...COMMITTED, interactions }, points)
          .filter(({ use }) => use === 'fit')
          .reduce((sum, { residualC, sigmaC }) => sum + (residualC / sigmaC) ** 2, 0);
      };
      const least = cost(fit.values);
      fit.values.forEach((_, k) => {
        for (const side of [-1, 1]) {
          const moved = fit.values.map((value, j) => (j === k ? value + side * (fit.errors[k] ?? 0) : value));
          expect(cost(moved)).toBeGreaterThan(least);
        }
      });
      expect(fit.values.length).toBe(fit.errors.length);
    });

    it('is the one committed', () => {
      const fits = STAGES.reduce((model, stage) => fitStage(stage, model, POINTS).model, COMMITTED);
      expect(fits.interactions).toEqual(COMMITTED.interactions);
    });
  },
);

describe('Au-Cu', { timeout: 30_000 }, () => {
  // Published: Okamoto, Chakrabarti, Laughlin, Massalski, Bull. Alloy Phase Diagrams 8 (1987) 454: congruent minimum
  // 910 °C at 44 at% Cu (20.2 wt%). AWS A5.8 BAu-2 (Au80 Cu20) prints 890 °C, an older textbook 905.
  it('has its minimum near 910 °C and 44 at% copper', () => {
    const section = binarySection({ kind: 'binary', elements: ['Au', 'Cu'] });
    if (!section.withinModel) throw new Error(section.reason);
    const [minimum] = section.invariants;
    expect(minimum?.name).toBe('congruent minimum');
    expect(Math.abs((minimum?.temperatureC ?? 0) - 910)).toBeLessThan(4);
    expect(Math.abs((minimum?.liquidX ?? 0) - 20.2)).toBeLessThan(2.5);
  });

  // Published: Okamoto et al.: a continuous solid solution below the solidus and above the ordered phases (410 °C).
  it('is of one solid at 450 °C whatever its composition', () => {
    for (let copper = 5; copper < 100; copper += 5) {
      const state = equilibrium({ Au: 100 - copper, Cu: copper }, 450);
      expect(state.withinModel && state.phases.map((phase) => phase.name)).toEqual(['fcc']);
    }
  });
});

describe('Ag-Au', () => {
  // Published: Okamoto and Massalski, Bull. Alloy Phase Diagrams 4 (1983) 30: liquidus and solidus about 2 °C apart.
  it('freezes within about 2 °C', () => {
    for (const gold of [25, 50, 75]) {
      const range = meltingRange({ Au: gold, Ag: 100 - gold });
      if (!range.withinModel) throw new Error(range.reason);
      expect(range.liquidusC - range.solidusC).toBeLessThan(3);
    }
  });
});

describe('silver brazing fillers', () => {
  // Memory: AWS A5.8 liquidus of BAg-5, -6, -9, -10, -11 (Ag-Cu-Zn), °C; handbook ranges scatter by about 10.
  it.each([
    ['BAg-6', { Ag: 50, Cu: 34, Zn: 16 }, 774],
    ['BAg-9', { Ag: 65, Cu: 20, Zn: 15 }, 718],
    ['BAg-10', { Ag: 70, Cu: 20, Zn: 10 }, 738],
    ['BAg-11', { Ag: 75, Cu: 22, Zn: 3 }, 788],
  ])('%s is liquid where the standard says', (_, wt, liquidusC) => {
    const range = meltingRange(wt);
    if (!range.withinModel) throw new Error(range.reason);
    expect(Math.abs(range.liquidusC - liquidusC)).toBeLessThan(15);
  });

  // BAg-20 and BAg-35 hold some 36 at% zinc: beta forms in them, and the model has none.
  it.each([
    { Ag: 30, Cu: 38, Zn: 32 },
    { Ag: 35, Cu: 32, Zn: 33 },
  ])('a filler too rich in zinc is refused', (wt) => {
    expect(meltingRange(wt)).toMatchObject({ withinModel: false, code: 'phase-outside-model' });
  });
});
