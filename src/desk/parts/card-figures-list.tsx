import type { CardFigures, FigureKey } from '#shared/domain/pour-card/card-figures.ts';
import { formatClock } from '#shared/lib/units.ts';
import { formatInput } from '#src/lib/formats.ts';
import { FigureBasis } from '#src/ui/figure-basis.tsx';
import { quenchWords } from './quench-words.ts';
import { useStudio, type StudioWriting } from './use-studio.ts';

interface Figure {
  readonly key: FigureKey;
  readonly label: string;
  readonly value: string;
}

const figuresOf = (
  figures: CardFigures,
  { temperature, degrees, mass }: StudioWriting,
): readonly Figure[] => {
  const { pourC } = figures;
  return [
    { key: 'pour', label: 'Pour', value: `${degrees(pourC.low)}–${temperature(pourC.high)}` },
    { key: 'meltHold', label: 'Melt held at', value: temperature(figures.meltHoldC) },
    { key: 'flaskHold', label: 'Flask in the furnace', value: temperature(figures.flaskHoldC) },
    { key: 'flaskPour', label: 'Flask at the pour, at least', value: temperature(figures.flaskPourLowC) },
    { key: 'pourWindow', label: 'From furnace to pour', value: formatClock(figures.pourWindowS) },
    { key: 'quench', label: 'Quench', value: quenchWords(figures.quench) },
    { key: 'liquidus', label: 'All liquid above', value: temperature(figures.liquidusC) },
    { key: 'solidus', label: 'All solid below', value: temperature(figures.solidusC) },
    { key: 'metalWanted', label: 'Metal by the wax', value: mass(figures.metalWantedG) },
  ];
};

/** Props of {@link CardFiguresList}. */
export interface CardFiguresListProps {
  readonly figures: CardFigures;
  /** The figures to show, in the card's order; all of them unless given. */
  readonly only?: readonly FigureKey[];
  readonly className: string;
}

/** The figures of a pour card; each tells its rule, inputs and source when pressed. */
export const CardFiguresList = ({ figures, only, className }: CardFiguresListProps) => {
  const writing = useStudio();
  return (
    <ul className={className}>
      {figuresOf(figures, writing)
        .filter(({ key }) => !only || only.includes(key))
        .map(({ key, label, value }) => {
          const { rule, inputs, source } = figures.basis[key];
          const written = inputs.map((input) => ({
            label: input.label,
            value: formatInput(input, writing.units),
          }));
          return (
            <li key={key}>
              <FigureBasis label={label} value={value} basis={{ rule, inputs: written, source }} />
            </li>
          );
        })}
    </ul>
  );
};
