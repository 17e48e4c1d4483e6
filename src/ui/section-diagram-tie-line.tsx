/** One end of a tie line: its place in px, and what share of the mass is there. */
export interface TieLineEnd {
  readonly x: number;
  readonly massFraction: number;
  readonly isLiquid: boolean;
}

/** Props of {@link SectionTieLine}, in px. */
export interface SectionTieLineProps {
  readonly y: number;
  readonly left: number;
  readonly right: number;
  /** Place of the alloy's own line: there the beam is held up. */
  readonly alloyX: number;
  /** Empty where the metal is of one phase. */
  readonly ends: readonly TieLineEnd[];
  /** False where the phases lie off the section: the beam is then only its shadow, and is drawn broken. */
  readonly inPlane: boolean;
}

const fullRadius = 17;
const leastRadius = 3.5;
const beamHalf = 4.5;

const tones = {
  liquid: { filled: 'fill-ember-fill', open: 'fill-ground stroke-ember-fill' },
  solid: { filled: 'fill-iron', open: 'fill-ground stroke-iron' },
} as const;

const radiusOf = ({ massFraction }: TieLineEnd): number =>
  Math.max(leastRadius, fullRadius * Math.sqrt(massFraction));

/** Middles of the weights: over their ends, but set apart where a short beam would lay one over the other. */
const standing = (ends: readonly TieLineEnd[]): readonly number[] => {
  const inOrder = ends.toSorted((a, b) => a.x - b.x);
  const [first, last] = [inOrder[0], inOrder.at(-1)];
  if (!first || !last || inOrder.length !== 2) return ends.map(({ x }) => x);
  const overlap = Math.max(0, radiusOf(first) + radiusOf(last) + 2 - (last.x - first.x));
  return ends.map((end) => end.x + (end === first ? -overlap / 2 : overlap / 2));
};

const Weight = ({
  end,
  x,
  inPlane,
}: {
  readonly end: TieLineEnd;
  readonly x: number;
  readonly inPlane: boolean;
}) => {
  const { isLiquid } = end;
  const r = radiusOf(end);
  const tone = tones[isLiquid ? 'liquid' : 'solid'];
  return (
    <circle
      cx={x}
      cy={-beamHalf - r}
      r={r}
      className={inPlane ? tone.filled : tone.open}
      strokeWidth={inPlane ? 0 : 3.5}
      data-part={isLiquid ? 'liquid-end' : 'solid-end'}
    />
  );
};

/**
 * The tie line at one temperature, drawn as the beam it is: it ends on the boundaries of the two phases, carries their
 * weights and stands on the alloy's own line.
 */
export const SectionTieLine = ({ y, left, right, alloyX, ends, inPlane }: SectionTieLineProps) => {
  const places = ends.map(({ x }) => x);
  const [from, to] = [Math.min(...places), Math.max(...places)];
  const middles = standing(ends);
  const hasBeam = ends.length > 1;
  return (
    <g style={{ transform: `translateY(${y}px)` }} data-part="tie-line">
      <path d={`M${left} 0 H${right}`} className="stroke-ink" strokeWidth="1.7" strokeDasharray="3 6" />
      {hasBeam ? (
        <>
          <path d={`M${alloyX} 3 l-12 21 h24z`} className="fill-ink stroke-ground" strokeWidth="1.5" />
          {ends.map((end, index) => (
            <Weight key={end.x} end={end} x={middles[index] ?? end.x} inPlane={inPlane} />
          ))}
          <path
            d={`M${from} 0 H${to}`}
            className="stroke-ink"
            strokeWidth={beamHalf * 2}
            strokeLinecap="round"
            strokeDasharray={inPlane ? undefined : '1 13'}
            data-part="beam"
            data-from={from}
            data-to={to}
          />
        </>
      ) : (
        <circle cx={alloyX} r="7" className="fill-ground stroke-ink" strokeWidth="4" data-part="place" />
      )}
    </g>
  );
};
