import type { AlloyFigures } from '#shared/domain/alloy/alloy-figures.ts';
import type { Band, RangeBand } from '#shared/metallurgy/index.ts';
import { formatPercent } from '#shared/lib/units.ts';
import type { StudioWriting } from '../../parts/use-studio.ts';

/** Props of {@link MeltingRows}. */
export interface MeltingRowsProps {
  readonly figures: AlloyFigures;
  readonly band: RangeBand | null;
  /** What the band is for, in words: "for ±0.3 Cu". */
  readonly toleranceWords: string;
  /** Share of an as-cast piece that freezes at once at the end; null while it is not known. */
  readonly lastAtOnce: number | null;
  readonly studio: StudioWriting;
}

interface Row {
  readonly term: string;
  readonly celsius: number | null;
  /** What stands in the place of a temperature that there is not. */
  readonly without: string;
  readonly note: string;
}

const writeBand = (band: Band | null | undefined, { degrees }: StudioWriting): string => {
  if (!band) return '';
  const [low, high] = [degrees(band.low), degrees(band.high)];
  return low === high ? `${low} throughout` : `${low} to ${high}`;
};

const rowsOf = ({ figures, band, toleranceWords, lastAtOnce, studio }: MeltingRowsProps): readonly Row[] => {
  const liquidus = writeBand(band?.liquidusC, studio);
  const unknown = figures.basis === 'measured' ? 'not measured' : 'not computed';
  const pockets = lastAtOnce !== null && lastAtOnce > 0.01 ? `last ${formatPercent(lastAtOnce)} at once` : '';
  return [
    {
      term: 'All liquid above',
      celsius: figures.liquidusC,
      without: unknown,
      note: liquidus && toleranceWords ? `${liquidus} ${toleranceWords}` : liquidus,
    },
    {
      term: 'All solid below',
      celsius: figures.solidusC,
      without: unknown,
      note: writeBand(band?.solidusC, studio),
    },
    {
      term: 'As cast, melts again at',
      celsius: figures.asCastSolidusC,
      without: unknown,
      note: pockets || writeBand(band?.asCastSolidusC, studio),
    },
    {
      term: 'Dissolves above',
      celsius: figures.solvusC,
      without: figures.basis === 'measured' ? unknown : 'no solvus',
      note: figures.solvusC === null ? '' : 'below it, two solids',
    },
  ];
};

/** The four temperatures of an alloy, each with how far it may lie for the tolerance of its composition. */
export const MeltingRows = (props: MeltingRowsProps) => (
  <table className="w-full">
    <caption className="sr-only">Temperatures of this revision</caption>
    <tbody>
      {rowsOf(props).map(({ term, celsius, without, note }) => (
        <tr key={term} className="border-t-2 border-line last:border-b-2">
          <th scope="row" className="py-2 pr-1 text-left text-[15px] font-semibold text-soft">
            {term}
          </th>
          <td className="py-2 text-right text-xl font-black whitespace-nowrap">
            {celsius === null ? (
              <span className="text-base">{without}</span>
            ) : (
              props.studio.temperature(celsius)
            )}
          </td>
          <td className="py-2 pl-3 text-right text-[14px] leading-tight text-soft">{note}</td>
        </tr>
      ))}
    </tbody>
  </table>
);
