import { useId } from 'react';
import { beamGeometry, phasePercents, type MeltBalance } from './beam-geometry.ts';
import { ColumnDrawing, columnFrame } from './column-drawing.tsx';
import { columnSentence, meltStateAt } from './column-sentence.ts';
import { BalancedWeights, EmptyBeam, LoneWeight } from './beam-weights.tsx';
import { PhasePatterns } from './phase-patterns.tsx';
import { ReadingPointer } from './reading-pointer.tsx';
import { temperatureScale, type ColumnTemperatures } from './temperature-scale.ts';

/** Props of {@link MeltBeam}. */
export interface MeltBeamProps extends ColumnTemperatures {
  /** The live reading in °C; null before the first. */
  readonly readingC: number | null;
  /** The tie line at the reading; null when the metal is of one phase, or when it cannot be computed. */
  readonly balance: MeltBalance | null;
  /** Writes a temperature as a figure in the studio's unit, without the unit. */
  readonly format: (celsius: number) => string;
  /** The studio's unit, such as "°C"; spoken only. */
  readonly unit: string;
  readonly className?: string;
}

const columnX = 368;
const frame = { left: 68, right: 290, fullRadius: 54 } as const;

const beamSentence = ({ element, alloyWt, solidWt, liquidWt, solidMassFraction }: MeltBalance): string => {
  const [solid, liquid] = phasePercents(solidMassFraction);
  return `${solid} solid by mass, with ${solidWt.toFixed(1)} % ${element}; ${liquid} liquid, with ${liquidWt.toFixed(1)} % ${element}; the alloy has ${alloyWt.toFixed(1)} %.`;
};

/**
 * The lever rule as a balance: a beam beside the temperature column, level at the reading, its arms drawn to scale
 * from the tie line and its weights from the masses of solid and liquid, standing on the alloy's composition.
 */
export const MeltBeam = ({ readingC, balance, format, unit, className, ...column }: MeltBeamProps) => {
  const patterns = useId();
  const scale = temperatureScale(column, columnFrame.scaleTop, columnFrame.scaleBottom);
  const state = meltStateAt(readingC, column);
  const tie = state === 'mushy' ? balance : null;
  const y = scale(readingC ?? (column.solidusC + column.liquidusC) / 2);
  return (
    <svg
      viewBox="0 0 540 580"
      role="img"
      aria-label={[
        columnSentence(column, readingC, format, unit),
        tie ? beamSentence(tie) : state === 'mushy' ? 'The share of solid is not computed.' : '',
      ]
        .join(' ')
        .trim()}
      className={className ?? 'h-full max-h-[620px] w-full'}
    >
      <PhasePatterns id={patterns} />
      <ColumnDrawing column={column} scale={scale} x={columnX} patterns={patterns} format={format} />
      {readingC === null ? null : <ReadingPointer x={columnX} y={y} needleFrom={frame.right} />}
      <g className="glide" style={{ transform: `translateY(${y}px)` }} data-part="beam">
        {tie ? (
          <BalancedWeights balance={tie} geometry={beamGeometry(tie, frame)} patterns={patterns} />
        ) : state === 'solid' || state === 'liquid' ? (
          <LoneWeight phase={state} frame={frame} patterns={patterns} />
        ) : (
          <EmptyBeam frame={frame} words={state === null ? 'no reading yet' : 'share not computed'} />
        )}
      </g>
    </svg>
  );
};
