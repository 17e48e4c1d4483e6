import { useId } from 'react';
import { crucibleLayers, type CrucibleLabel, type CrucibleLot } from './crucible-layers.ts';

export type { CrucibleLot };

/** Props of {@link Crucible}. */
export interface CrucibleProps {
  /** The lots of the charge in the order they go in. */
  readonly lots: readonly CrucibleLot[];
  /** Metal wanted in all, in grams. */
  readonly wantedG: number;
  /** Writes a mass with its unit. */
  readonly format: (grams: number) => string;
  /** False for the picture alone, where a list of the lots stands beside it. */
  readonly labelled?: boolean;
  readonly className?: string;
}

const inner = { top: 62, bottom: 404 } as const;
const pot = 'M40 50 L62 368 Q66 404 102 404 H214 Q250 404 254 368 L276 50';

const fills: Readonly<Record<CrucibleLot['kind'], string>> = {
  gold: 'fill-brass-fill',
  silver: 'fill-silver-fill',
  returns: 'fill-brass-fill opacity-45',
  other: 'fill-silver-fill opacity-45',
};

const sentence = ({ lots, wantedG, format }: Pick<CrucibleProps, 'lots' | 'wantedG' | 'format'>): string =>
  [
    ...lots.map((lot) => `${lot.label}: ${format(lot.inG)} in, of ${format(lot.plannedG)}.`),
    `Wanted in all: ${format(wantedG)}.`,
  ].join(' ');

/** A written mass without its unit. */
const figureOf = (written: string): string => written.split(/\s/)[0] ?? written;

const progressWords = ({ inG, plannedG }: CrucibleLabel, format: (grams: number) => string): string => {
  if (inG === 0) return `${format(plannedG)} to come`;
  return inG < plannedG ? `${figureOf(format(inG))} of ${format(plannedG)}` : `${format(inG)} in`;
};

/** The crucible as it fills: a layer for each lot, hatching for what is still to come, and a line at the metal wanted. */
export const Crucible = ({ lots, wantedG, format, labelled = true, className }: CrucibleProps) => {
  const id = useId();
  const { layers, labels, wantedY } = crucibleLayers(lots, wantedG, inner.top, inner.bottom);
  return (
    <svg
      viewBox={labelled ? '0 0 564 424' : '8 36 300 384'}
      role="img"
      aria-label={sentence({ lots, wantedG, format })}
      className={className ?? 'w-full'}
    >
      <defs>
        <pattern
          id={`${id}-come`}
          width="13"
          height="13"
          patternUnits="userSpaceOnUse"
          patternTransform="rotate(45)"
        >
          <rect width="3.5" height="13" className="fill-soft" />
        </pattern>
        <clipPath id={`${id}-pot`}>
          <path d={`${pot} Z`} />
        </clipPath>
      </defs>
      <g clipPath={`url(#${id}-pot)`}>
        <rect y="50" width="340" height="360" className="fill-panel" />
        {layers.map((layer) => (
          <g key={layer.key}>
            <rect
              y={layer.y}
              width="340"
              height={layer.height}
              className={layer.isIn ? fills[layer.kind] : ''}
              fill={layer.isIn ? undefined : `url(#${id}-come)`}
              data-part={layer.isIn ? 'in' : 'to-come'}
            />
            <path d={`M0 ${layer.y} H340`} className="stroke-ink" strokeWidth={layer.isIn ? 3.5 : 2} />
          </g>
        ))}
      </g>
      <path
        d={`M18 46 H40 M276 46 H298 ${pot}`}
        fill="none"
        className="stroke-ink"
        strokeWidth="9"
        strokeLinejoin="round"
        strokeLinecap="round"
      />
      <path d={`M22 ${wantedY} H294`} className="stroke-ember" strokeWidth="6" strokeDasharray="16 9" />
      {labelled ? (
        <text x="310" y={wantedY + 8} className="fill-ember text-[24px] font-black">
          {format(wantedG)} wanted
        </text>
      ) : null}
      {(labelled ? labels : []).map((label) => (
        <g key={label.key} transform={`translate(310 ${label.y})`}>
          <path d="M-44 0 h34" className="stroke-ink" strokeWidth="3" />
          <text y="-2" className="fill-ink text-[24px] font-black">
            {label.text}
          </text>
          <text y="24" className="fill-soft text-[22px] font-bold">
            {progressWords(label, format)}
          </text>
        </g>
      ))}
    </svg>
  );
};
