import type { PourCard } from '#shared/contracts/card.ts';
import type { Basis } from '#shared/domain/pour-card/basis.ts';
import type { CardFigures, FigureKey } from '#shared/domain/pour-card/card-figures.ts';
import type { CardContext } from '#shared/domain/pour-card/card-state.ts';
import { formatClock, type Units } from '#shared/lib/units.ts';
import { formatInput } from '#src/lib/formats.ts';
import { FigureBasis } from '#src/ui/figure-basis.tsx';
import type { UnitWriter } from '#kiosk/lib/unit-writer.ts';

/** A basis with its inputs written in the studio's units. */
export const writtenBasis = ({ rule, inputs, source }: Basis, units: Units) => ({
  rule,
  source,
  inputs: inputs.map((input) => ({ label: input.label, value: formatInput(input, units) })),
});

/** The quench rule in a few words: from when, until when, in what. */
export const quenchWords = ({ earliestS, latestS, medium }: CardFigures['quench']): string => {
  const from = formatClock(earliestS);
  return latestS === null ? `after ${from}, ${medium}` : `${from} to ${formatClock(latestS)}, ${medium}`;
};

interface Row {
  readonly key: FigureKey;
  readonly label: string;
  readonly value: string;
}

const rowsOf = ({ figures, plannedMetalG }: CardContext, write: UnitWriter): readonly Row[] => {
  const { pourC } = figures;
  return [
    { key: 'metalWanted', label: 'Metal wanted', value: write.mass(plannedMetalG) },
    { key: 'pourWindow', label: 'Flask out to pour', value: formatClock(figures.pourWindowS) },
    { key: 'meltHold', label: 'Hold the melt at', value: write.temperature(figures.meltHoldC) },
    {
      key: 'pour',
      label: 'Pour between',
      value: `${write.degrees(pourC.low)}–${write.temperature(pourC.high)}`,
    },
    { key: 'flaskHold', label: 'Flask in the furnace', value: write.temperature(figures.flaskHoldC) },
    { key: 'flaskPour', label: 'Flask no colder than', value: write.temperature(figures.flaskPourLowC) },
    { key: 'liquidus', label: 'All liquid above', value: write.temperature(figures.liquidusC) },
    { key: 'solidus', label: 'All solid below', value: write.temperature(figures.solidusC) },
    { key: 'quench', label: 'Quench', value: quenchWords(figures.quench) },
  ];
};

/** Props of {@link CardFiguresGrid}. */
export interface CardFiguresGridProps {
  readonly card: PourCard;
  readonly write: UnitWriter;
  /** Whether there is room for three figures side by side. */
  readonly isWide?: boolean;
}

/** Every figure of the card; each tells, when touched, its rule, what went in, and whose rule it is. */
export const CardFiguresGrid = ({ card, write, isWide = false }: CardFiguresGridProps) => {
  const { figures } = card.context;
  return (
    <div
      role="group"
      aria-label="Figures of this card"
      className={`grid gap-x-4 gap-y-3 ${isWide ? 'grid-cols-3 portrait:grid-cols-2' : 'grid-cols-2'}`}
    >
      {rowsOf(card.context, write).map(({ key, label, value }) => (
        <div key={key} className={key === 'quench' && !isWide ? 'col-span-2 grid' : 'grid'}>
          <FigureBasis
            label={label}
            value={value}
            basis={writtenBasis(figures.basis[key], write.units)}
            size="terminal"
          />
        </div>
      ))}
    </div>
  );
};
