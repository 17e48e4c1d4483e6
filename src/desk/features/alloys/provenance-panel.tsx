import type { AlloyRevision } from '#shared/contracts/alloy.ts';
import { ENGINE_VERSION, PROVENANCE, type ParameterSource } from '#shared/metallurgy/index.ts';
import { Disclosure, Panel } from './panel.tsx';
import { PlainTable } from './plain-table.tsx';

const figureRules = [
  [
    'All liquid above (liquidus)',
    'The temperature at which the first solid of least Gibbs energy appears in the liquid.',
  ],
  [
    'All solid below (solidus)',
    'The temperature at which the first liquid appears in the homogenised solid.',
  ],
  [
    'As cast, melts again at',
    'Where the last liquid goes when nothing diffuses in the solid (Scheil-Gulliver).',
  ],
  ['Dissolves above (solvus)', 'The temperature above which the homogenised solid is of one kind.'],
  [
    'Shares and compositions of the phases',
    'The common tangent plane of the Gibbs energies at that temperature.',
  ],
  ['Ranges for the tolerance', 'Lowest and highest value met at and inside the limits of the tolerances.'],
  ['Density', 'Additive volumes of the pure metals.'],
] as const;

/** The parameters that bear on an alloy: of the pure metals, and of each system it contains. */
const bearingOn = (elements: readonly string[]): readonly ParameterSource[] =>
  PROVENANCE.filter(({ what }) => {
    const named = what.split('-');
    return named.some((part) => part.includes(' ')) || named.every((part) => elements.includes(part));
  });

/** Where every number of the page comes from: the rule of each figure, and the parameters with their sources. */
export const ProvenancePanel = ({ revision }: { readonly revision: AlloyRevision }) => {
  const { figures, compositionWt } = revision;
  if (figures.basis === 'measured') {
    return (
      <Panel title="Where the numbers come from">
        <p>
          <strong>Measured range, not computed.</strong> {revision.outsideModel}
        </p>
        <p>Source: {figures.source}</p>
      </Panel>
    );
  }
  return (
    <Panel title="Where the numbers come from">
      <p>
        {figures.source} The diagram and the curves are drawn by engine {ENGINE_VERSION}.
      </p>
      <Disclosure summary="How each figure is computed">
        <PlainTable
          caption="The rule of each figure"
          heads={['Figure', 'Rule']}
          align="left"
          rows={figureRules.map(([figure, rule]) => ({ key: figure, cells: [figure, rule] }))}
        />
      </Disclosure>
      <Disclosure summary="Parameters and their sources">
        <PlainTable
          caption="Parameters that bear on this alloy"
          heads={['Parameters', 'Basis', 'Source']}
          align="left"
          rows={bearingOn(Object.keys(compositionWt)).map(({ what, basis, source }) => ({
            key: what,
            cells: [what, basis, source],
          }))}
        />
      </Disclosure>
    </Panel>
  );
};
