import type { CoolingCurve } from '#shared/contracts/cooling-curve.ts';
import { fromCelsius, fromCelsiusDifference } from '#shared/lib/units.ts';
import { PlainTable } from '#src/desk/parts/plain-table.tsx';
import { useStudio } from '#src/desk/parts/use-studio.ts';

const none = '–';

/** What was computed and what was found on a cooling curve, figure by figure, and how well it was logged. */
export const CoolingCurveTable = ({ curve }: { readonly curve: CoolingCurve }) => {
  const { units } = useStudio();
  const unit = units.temperature;
  const { verdict, thermometerC } = curve;
  const { observed, computed, quality } = verdict;
  const at = (celsius: number | null | undefined): string =>
    celsius === null || celsius === undefined ? none : fromCelsius(celsius, unit).toFixed(0);
  const by = (celsius: number): string => fromCelsiusDifference(celsius, unit).toFixed(1);
  return (
    <div className="grid gap-4">
      <PlainTable
        caption="Where it freezes"
        heads={[`°${unit}`, 'Computed', 'Found']}
        rows={[
          { key: 'liquidus', cells: ['Begins to freeze', at(computed?.liquidusC), at(observed?.liquidusC)] },
          { key: 'plateau', cells: ['Stands still once more', none, at(observed?.plateauC)] },
          { key: 'slow', cells: ['All solid, frozen slowly', at(computed?.solidusC), none] },
          { key: 'cast', cells: ['All solid, as cast', at(computed?.asCastSolidusC), at(observed?.endC)] },
        ]}
      />
      <PlainTable
        caption="How well it is known"
        heads={['', `°${unit}`]}
        rows={[
          {
            key: 'allowed',
            cells: ['May differ by', verdict.kind === 'cannot-tell' ? none : `± ${by(verdict.allowedC)}`],
          },
          { key: 'thermometer', cells: ['of which the thermometer', `± ${by(thermometerC)}`] },
          {
            key: 'curve',
            cells: ['and the curve', observed ? `± ${by(2 * observed.liquidusErrorC)}` : none],
          },
          {
            key: 'undercooling',
            cells: ['Fell below before it froze, about', observed ? by(observed.undercoolingC) : none],
          },
          { key: 'noise', cells: ['Noise', by(quality.noiseC)] },
          { key: 'offset', cells: ['Offset in force', by(curve.offsetC)] },
        ]}
      />
    </div>
  );
};
