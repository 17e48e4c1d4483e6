import { useId } from 'react';
import { ColumnDrawing, columnFrame } from './column-drawing.tsx';
import { columnSentence } from './column-sentence.ts';
import { PhasePatterns } from './phase-patterns.tsx';
import { ReadingPointer } from './reading-pointer.tsx';
import { temperatureScale, type ColumnTemperatures } from './temperature-scale.ts';

/** Props of {@link TemperatureColumn}. */
export interface TemperatureColumnProps extends ColumnTemperatures {
  /** The live reading in °C; null before the first. */
  readonly readingC: number | null;
  /** Writes a temperature as a figure in the studio's unit, without the unit. */
  readonly format: (celsius: number) => string;
  /** The studio's unit, such as "°C"; spoken only. */
  readonly unit: string;
  readonly className?: string;
}

const x = 60;

/** An alloy's temperatures as a column: solid hatched, mushy dotted, liquid plain, the pour window and the reading. */
export const TemperatureColumn = ({
  readingC,
  format,
  unit,
  className,
  ...column
}: TemperatureColumnProps) => {
  const patterns = useId();
  const scale = temperatureScale(column, columnFrame.scaleTop, columnFrame.scaleBottom);
  return (
    <svg
      viewBox="0 0 224 580"
      role="img"
      aria-label={columnSentence(column, readingC, format, unit)}
      className={className ?? 'h-full max-h-[600px] w-[206px] shrink-0'}
    >
      <PhasePatterns id={patterns} />
      <ColumnDrawing column={column} scale={scale} x={x} patterns={patterns} format={format} />
      {readingC === null ? null : <ReadingPointer x={x} y={scale(readingC)} needleFrom={x - 34} />}
    </svg>
  );
};
