/** Props of {@link FinenessScale}; finenesses in parts per thousand. */
export interface FinenessScaleProps {
  /** The mark the charge must not fall below. */
  readonly mark: number;
  /** The charge's fineness in the worst case so far; null before anything is in. */
  readonly worst: number | null;
  /** Its fineness by the certificates as they stand, where that is shown as well. */
  readonly expected?: number | null;
  readonly range: { readonly low: number; readonly high: number };
  /** Writes a fineness; it must round down. */
  readonly format: (fineness: number) => string;
  readonly className?: string;
}

const left = 24;
const right = 496;
const y = 62;

const sentence = ({ mark, worst, expected = null, format }: FinenessScaleProps): string =>
  worst === null
    ? `Fineness: nothing weighed in yet, mark ${format(mark)}.`
    : `Fineness in the worst case ${format(worst)}, ${worst < mark ? 'below' : 'not below'} the mark ${format(mark)}${expected === null ? '' : `, expected ${format(expected)}`}.`;

type Side = 'start' | 'middle' | 'end';

/** Which side of its pointer the words hang to, so that they stay within the picture. */
const sideOf = (at: number): Side => (at > 400 ? 'end' : at < 120 ? 'start' : 'middle');

const nudges: Readonly<Record<Side, number>> = { start: -14, middle: 0, end: 14 };

/** The fineness of a charge in its worst case against its mark: hatched below the mark, plain from the mark up. */
export const FinenessScale = (props: FinenessScaleProps) => {
  const { mark, worst, expected = null, range, format, className } = props;
  const x = (fineness: number): number => {
    const share = (fineness - range.low) / (range.high - range.low);
    return left + Math.min(1, Math.max(0, share)) * (right - left);
  };
  const worstSide = worst === null ? 'middle' : expected === null ? sideOf(x(worst)) : 'end';
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
            x={expected === null ? nudges[worstSide] : -6}
            y={y - 40}
            textAnchor={worstSide}
            className={`text-[24px] font-black ${worst < mark ? 'fill-ember' : 'fill-brass'}`}
          >
            {format(worst)} at worst
          </text>
        </g>
      )}
      {expected === null ? null : (
        <g className="glide" style={{ transform: `translateX(${x(expected)}px)` }} data-part="expected">
          <circle cy={y} r="9" className="fill-ground stroke-ink" strokeWidth="4" />
          <text x="10" y={y - 40} className="fill-soft text-[24px] font-black">
            {format(expected)} expected
          </text>
        </g>
      )}
    </svg>
  );
};
