import { phasePercents, type BeamFrame, type BeamGeometry, type MeltBalance } from './beam-geometry.ts';

const beamHalf = 5;
// Half the width of "51 % solid": such a label stands centred, a longer one grows toward the middle.
const labelReach = 64;

const Fulcrum = ({ x }: { readonly x: number }) => (
  <path
    d="M0 6 l-25 43 h50z"
    className="glide fill-ink stroke-ink"
    strokeWidth="3"
    strokeLinejoin="round"
    style={{ transform: `translateX(${x}px)` }}
    data-part="fulcrum"
    data-x={x}
  />
);

const Beam = ({ left, right }: { readonly left: number; readonly right: number }) => (
  <path
    d={`M${left} 0 H${right}`}
    className="stroke-ink"
    strokeWidth={beamHalf * 2}
    strokeLinecap="round"
    data-part="arms"
  />
);

interface WeightProps {
  readonly phase: 'solid' | 'liquid';
  readonly x: number;
  readonly radius: number;
  readonly patterns: string;
}

/** A weight that stands on the beam: hatched solid or plain liquid, its area as its mass. */
const Weight = ({ phase, x, radius, patterns }: WeightProps) => {
  const isSolid = phase === 'solid';
  return (
    <circle
      cx={x}
      cy={-beamHalf - radius}
      r={radius}
      fill={isSolid ? `url(#${patterns}-solid)` : undefined}
      className={isSolid ? 'glide' : 'glide fill-ember-fill'}
      data-part={`${phase}-weight`}
    />
  );
};

const WeightRim = ({ phase, x, radius }: Omit<WeightProps, 'patterns'>) =>
  phase === 'solid' && radius > 3 ? (
    <circle
      cx={x}
      cy={-beamHalf - radius}
      r={radius - 2.5}
      fill="none"
      className="glide stroke-iron"
      strokeWidth="5"
    />
  ) : null;

/** Props of {@link BalancedWeights}. */
export interface BalancedWeightsProps {
  readonly balance: MeltBalance;
  readonly geometry: BeamGeometry;
  readonly patterns: string;
}

// A figure under the beam's end steps outward when the fulcrum stands where it would be written.
const isCrowded = (end: number, fulcrum: number): boolean => Math.abs(end - fulcrum) < 62;

/** The two weights on their beam, each with its share above and its composition below. */
export const BalancedWeights = ({ balance, geometry, patterns }: BalancedWeightsProps) => {
  const { solidX, liquidX, fulcrumX, solidRadius, liquidRadius } = geometry;
  const [solid, liquid] = phasePercents(balance.solidMassFraction);
  const leftX = isCrowded(solidX, fulcrumX) ? fulcrumX - 32 : solidX;
  const rightX = isCrowded(liquidX, fulcrumX) ? fulcrumX + 32 : liquidX;
  return (
    <>
      <Weight phase="solid" x={solidX} radius={solidRadius} patterns={patterns} />
      <WeightRim phase="solid" x={solidX} radius={solidRadius} />
      <Weight phase="liquid" x={liquidX} radius={liquidRadius} patterns={patterns} />
      <Beam left={solidX} right={liquidX} />
      <Fulcrum x={fulcrumX} />
      <g className="text-[25px] font-black">
        <text x={solidX - labelReach} y={-2 * solidRadius - 20} className="fill-iron">
          {solid} solid
        </text>
        <text x={liquidX + labelReach} y={-2 * liquidRadius - 20} textAnchor="end" className="fill-ember">
          {liquid} liquid
        </text>
      </g>
      <g className="fill-soft text-[22px] font-extrabold">
        <text x={leftX} y="36" textAnchor={leftX === solidX ? 'middle' : 'end'}>
          {balance.solidWt.toFixed(1)}
        </text>
        <text x={rightX} y="36" textAnchor={rightX === liquidX ? 'middle' : 'start'}>
          {balance.liquidWt.toFixed(1)}
        </text>
      </g>
      <text
        x={Math.min(liquidX - 20, Math.max(solidX + 20, fulcrumX))}
        y="77"
        textAnchor="middle"
        className="fill-ink text-[23px] font-black"
      >
        {balance.alloyWt.toFixed(1)} % {balance.element}
      </text>
    </>
  );
};

/** Props of {@link LoneWeight}. */
export interface LoneWeightProps {
  readonly phase: 'solid' | 'liquid';
  readonly frame: BeamFrame;
  readonly patterns: string;
}

/** All the metal in one phase: a single weight that stands over the fulcrum. */
export const LoneWeight = ({ phase, frame, patterns }: LoneWeightProps) => {
  const middle = (frame.left + frame.right) / 2;
  return (
    <>
      <Weight phase={phase} x={middle} radius={frame.fullRadius} patterns={patterns} />
      <WeightRim phase={phase} x={middle} radius={frame.fullRadius} />
      <Beam left={frame.left} right={frame.right} />
      <Fulcrum x={middle} />
      <text
        x={middle}
        y="77"
        textAnchor="middle"
        className={`text-[25px] font-black ${phase === 'solid' ? 'fill-iron' : 'fill-ember'}`}
      >
        all {phase}
      </text>
    </>
  );
};

/** A beam with nothing on it, and why. */
export const EmptyBeam = ({ frame, words }: { readonly frame: BeamFrame; readonly words: string }) => {
  const middle = (frame.left + frame.right) / 2;
  return (
    <g>
      <path
        d={`M${frame.left} 0 H${frame.right}`}
        className="stroke-soft"
        strokeWidth="8"
        strokeLinecap="round"
        strokeDasharray="1 17"
      />
      <path
        d={`M${middle} 8 l-25 43 h50z`}
        fill="none"
        className="stroke-soft"
        strokeWidth="5"
        strokeLinejoin="round"
      />
      <text x={middle} y="81" textAnchor="middle" className="fill-soft text-[23px] font-extrabold">
        {words}
      </text>
    </g>
  );
};
