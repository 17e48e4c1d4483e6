import { columnLabels, type ColumnLabel } from './column-labels.ts';
import type { ColumnTemperatures, TemperatureScale } from './temperature-scale.ts';

/** Where the column stands in its picture; the scale ends above the foot so that a beam has room to stand. */
export const columnFrame = { top: 14, bottom: 566, scaleTop: 112, scaleBottom: 492, width: 58 } as const;

/** Props of {@link ColumnDrawing}. */
export interface ColumnDrawingProps {
  readonly column: ColumnTemperatures;
  readonly scale: TemperatureScale;
  /** Left edge of the column. */
  readonly x: number;
  readonly patterns: string;
  readonly format: (celsius: number) => string;
}

const labelLooks: Readonly<Record<ColumnLabel['look'], string>> = {
  mark: 'fill-ink text-[23px] font-black',
  window: 'fill-ember text-[24px] font-black',
  zone: 'fill-soft text-[22px] font-bold',
};

const Tick = ({ x, y }: { readonly x: number; readonly y: number }) => (
  <path d={`M${x} ${y} h12`} className="stroke-ink" strokeWidth="4" strokeLinecap="round" />
);

/** The column itself: hatched solid, dotted mushy zone, plain liquid, with its marks written at its right. */
export const ColumnDrawing = ({ column, scale, x, patterns, format }: ColumnDrawingProps) => {
  const { top, bottom, width } = columnFrame;
  const right = x + width;
  const [solidus, liquidus] = [scale(column.solidusC), scale(column.liquidusC)];
  const { windowC, asCastSolidusC } = column;
  return (
    <g data-part="column">
      <clipPath id={`${patterns}-tube`}>
        <rect x={x} y={top} width={width} height={bottom - top} rx={width / 2} />
      </clipPath>
      <g clipPath={`url(#${patterns}-tube)`}>
        <rect x={x} y={top} width={width} height={bottom - top} className="fill-ember-soft" />
        <rect x={x} y={liquidus} width={width} height={solidus - liquidus} fill={`url(#${patterns}-mushy)`} />
        <rect x={x} y={solidus} width={width} height={bottom - solidus} fill={`url(#${patterns}-solid)`} />
        <path
          d={`M${x} ${liquidus} h${width} M${x} ${solidus} h${width}`}
          className="stroke-ink"
          strokeWidth="3"
        />
        {asCastSolidusC === undefined ? null : (
          <path
            d={`M${x} ${scale(asCastSolidusC)} h${width}`}
            className="stroke-ink"
            strokeWidth="4"
            strokeDasharray="7 6"
          />
        )}
      </g>
      <rect
        x={x}
        y={top}
        width={width}
        height={bottom - top}
        rx={width / 2}
        fill="none"
        className="stroke-ink"
        strokeWidth="5"
      />
      <Tick x={right} y={liquidus} />
      <Tick x={right} y={solidus} />
      {asCastSolidusC === undefined ? null : <Tick x={right} y={scale(asCastSolidusC)} />}
      {windowC ? (
        <path
          d={`M${right + 8} ${scale(windowC.high)} h14 V${scale(windowC.low)} h-14`}
          fill="none"
          className="stroke-ember"
          strokeWidth="7"
          strokeLinejoin="round"
        />
      ) : null}
      {columnLabels(column, scale, format).map(({ key, y, text, look }) => (
        <text key={key} x={right + 32} y={y} dominantBaseline="central" className={labelLooks[look]}>
          {text}
        </text>
      ))}
    </g>
  );
};
