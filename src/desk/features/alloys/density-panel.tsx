import { useMemo } from 'react';
import type { AlloyFigures } from '#shared/domain/alloy/alloy-figures.ts';
import { density, type Density, type Outcome } from '#shared/metallurgy/index.ts';
import { FigureBasis, type Basis } from '#src/ui/figure-basis.tsx';
import { writeComposition } from './element-names.ts';
import { Panel } from './panel.tsx';

const computedBasis = (answer: Density, composition: string): Basis => ({
  rule: answer.basis,
  inputs: [
    { label: 'Composition, wt%', value: composition },
    { label: 'Error', value: `±${answer.errorGPerCm3.toFixed(2)} g/cm³` },
  ],
  source:
    'Handbook densities of the pure metals; error from published densities of gold-silver-copper alloys.',
});

const measuredBasis = ({ source }: AlloyFigures): Basis => ({
  rule: 'Measured, not computed: taken over as it was entered.',
  inputs: [],
  source,
});

/** A density with its error, or as it was measured. */
export const DensityPanel = ({
  figures,
  compositionWt,
}: {
  readonly figures: AlloyFigures;
  readonly compositionWt: Readonly<Record<string, number>>;
}) => {
  const answer: Outcome<Density> = useMemo(() => density(compositionWt), [compositionWt]);
  const isComputed = figures.basis === 'computed' && answer.withinModel;
  const value = `${figures.densityGPerCm3.toFixed(2)} ${isComputed ? `±${answer.errorGPerCm3.toFixed(2)} ` : ''}g/cm³`;
  return (
    <Panel title="Density">
      <FigureBasis
        label={isComputed ? 'By additive volumes' : 'Measured'}
        value={value}
        basis={isComputed ? computedBasis(answer, writeComposition(compositionWt)) : measuredBasis(figures)}
      />
      <p className="text-[15px] text-soft">
        Of sound metal at room temperature; porosity makes a casting lighter.
      </p>
    </Panel>
  );
};
