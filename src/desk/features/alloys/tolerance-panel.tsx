import type { UseQueryResult } from '@tanstack/react-query';
import { fromCelsiusDifference } from '#shared/lib/units.ts';
import type { Outcome, RangeBand } from '#shared/metallurgy/index.ts';
import { Spinner } from '#src/ui/spinner.tsx';
import type { StudioWriting } from '../../parts/use-studio.ts';
import { capitalised, elementName, writeWt } from './element-names.ts';
import { Panel } from './panel.tsx';
import { PlainTable } from './plain-table.tsx';

/** Props of {@link TolerancePanel}. */
export interface TolerancePanelProps {
  readonly query: UseQueryResult<Outcome<RangeBand>>;
  readonly toleranceWt: Readonly<Record<string, number>>;
  readonly studio: StudioWriting;
}

const Sensitivities = ({
  band,
  toleranceWt,
  studio,
}: Omit<TolerancePanelProps, 'query'> & { readonly band: RangeBand }) => {
  const unit = studio.units.temperature;
  const perTenth = (perWt: number): string => {
    const moved = fromCelsiusDifference(perWt / 10, unit);
    const sign = moved < 0 ? '−' : '+';
    return `${sign}${Math.abs(moved).toFixed(1)} °${unit}`;
  };
  return (
    <>
      <PlainTable
        caption="What a tenth of a per cent more of each metal does"
        heads={['0.1 % more', 'Tolerance', 'Liquidus', 'Solidus']}
        rows={band.sensitivities.map(({ element, liquidusCPerWt, solidusCPerWt }) => ({
          key: element,
          cells: [
            capitalised(elementName(element)),
            toleranceWt[element] ? `±${writeWt(toleranceWt[element])}` : 'none given',
            perTenth(liquidusCPerWt),
            perTenth(solidusCPerWt),
          ],
        }))}
      />
      <p className="text-[15px] text-soft">
        The ranges beside the temperatures were met in {band.compositions} compositions at and inside the
        tolerances; here the rest gives way in proportion.
      </p>
    </>
  );
};

/** How far the figures move when the composition is a little off. */
export const TolerancePanel = ({ query, ...rest }: TolerancePanelProps) => (
  <Panel title="If the composition is a little off">
    {query.data === undefined ? (
      <Spinner label="Computing the tolerance" />
    ) : query.data.withinModel ? (
      <Sensitivities band={query.data} {...rest} />
    ) : (
      <p className="text-soft">Not computed: {query.data.reason}</p>
    )}
  </Panel>
);
