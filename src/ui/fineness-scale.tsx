/** Props of {@link FinenessScale}; finenesses in parts per thousand. */
export interface FinenessScaleProps {
  /** The mark the charge must not fall below. */
  readonly mark: number;
  /** The charge's fineness in the worst case so far; null before anything is in. */
  readonly worst: number | null;
  readonly range: { readonly low: number; readonly high: number };
  /** Writes a fineness; it must round down. */
  readonly format: (fineness: number) => string;
  readonly className?: string;
}

const left = 24;
const right = 496;
const y = 62;

const sentence = ({ mark, worst, format }: FinenessScaleProps): string =>
  worst === null
    ? `Fineness: nothing weighed in yet, mark ${format(mark)}.`
    : `Fineness in the worst case ${format(worst)}, ${worst < mark ? 'below' : 'not below'} the mark ${format(mark)}.`;

/** The fineness of a charge in its worst case against its mark: hatched below the mark, plain from the mark up. */
export const FinenessScale = (props: FinenessScaleProps) => {
  const { mark, worst, range, format, className } = props;
  const x = (fineness: number): number => {
    const share = (fineness - range.low) / (range.high - range.low);
    return left + Math.min(1, Math.max(0, share)) * (right - left);
  };
  return (
    <svg viewBox="0 0 520 112" role="img" aria-label={sentence(props)} className={className ?? 'w-full'}>
      <path d={`M${left} ${y} H${x(mark)}`} className="stroke-soft" strokeWidth="14" strokeDasharray="4 7" />
      <path
        d={`M${x(mark)} ${y} H${right}`}
        className="stroke-brass-fill"
        strokeWidth="16"
        strokeLinecap="round"
      />
      <path d={`M${x(mark)} ${y - 17} v34`} className="stroke-ink" strokeWidth="7" strokeLinecap="round" />
      <text x={x(mark)} y={y + 43} textAnchor="middle" className="fill-ink text-[24px] font-black">
        {format(mark)} mark
      </text>
      {worst === null ? null : (
        <g className="glide" style={{ transform: `translateX(${x(worst)}px)` }} data-part="worst">
          <path d={`M0 ${y - 10} l-15 -23 h30z`} className="fill-ink" />
          <text
            x={x(worst) > 400 ? 14 : x(worst) < 120 ? -14 : 0}
            y={y - 40}
            textAnchor={x(worst) > 400 ? 'end' : x(worst) < 120 ? 'start' : 'middle'}
            className={`text-[24px] font-black ${worst < mark ? 'fill-ember' : 'fill-brass'}`}
          >
            {format(worst)} at worst
          </text>
        </g>
      )}
    </svg>
  );
};
