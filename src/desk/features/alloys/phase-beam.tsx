import { useId } from 'react';
import { beamGeometry, phasePercents } from '#src/ui/beam-geometry.ts';
import { PhasePatterns } from '#src/ui/phase-patterns.tsx';
import type { BeamPair, BeamWeight } from './beam-of-state.ts';

const frame = { left: 44, right: 386, fullRadius: 44 } as const;
const level = 106;
const beamHalf = 4.5;

interface WeightProps {
  readonly isLiquid: boolean;
  readonly x: number;
  readonly radius: number;
  readonly patterns: string;
}

const Weight = ({ isLiquid, x, radius, patterns }: WeightProps) => (
  <circle
    cx={x}
    cy={level - beamHalf - radius}
    r={Math.max(1, radius - 2)}
    fill={isLiquid ? undefined : `url(#${patterns}-solid)`}
    className={isLiquid ? 'fill-ember-fill' : 'stroke-iron'}
    strokeWidth={isLiquid ? 0 : 4}
    data-part={isLiquid ? 'liquid-weight' : 'solid-weight'}
  />
);

const Stand = ({ x, from, to }: { readonly x: number; readonly from: number; readonly to: number }) => (
  <>
    <path
      d={`M${from} ${level} H${to}`}
      className="stroke-ink"
      strokeWidth={beamHalf * 2}
      strokeLinecap="round"
    />
    <path
      d={`M${x} ${level + 5} l-19 32 h38z`}
      className="fill-ink stroke-ink"
      strokeWidth="2"
      strokeLinejoin="round"
      data-part="fulcrum"
      data-x={x}
    />
  </>
);

const sentenceOf = ({ element, alloyWt, left, right }: BeamPair): string => {
  const [leftShare, rightShare] = phasePercents(left.massFraction);
  return `${leftShare} ${left.words} by mass, with ${left.wt.toFixed(1)} % ${element}; ${rightShare} ${right.words}, with ${right.wt.toFixed(1)} % ${element}; the alloy has ${alloyWt.toFixed(1)} %.`;
};

const tone = ({ isLiquid }: BeamWeight): string => (isLiquid ? 'fill-ember' : 'fill-iron');

const Balanced = ({ pair, patterns }: { readonly pair: BeamPair; readonly patterns: string }) => {
  const { left, right, alloyWt, element } = pair;
  const geometry = beamGeometry(
    { element, alloyWt, solidWt: left.wt, liquidWt: right.wt, solidMassFraction: left.massFraction },
    frame,
  );
  const { solidX, liquidX, fulcrumX, solidRadius, liquidRadius } = geometry;
  const [leftShare, rightShare] = phasePercents(left.massFraction);
  const crowdsLeft = fulcrumX - solidX < 70;
  const crowdsRight = liquidX - fulcrumX < 70;
  return (
    <>
      <Weight isLiquid={left.isLiquid} x={solidX} radius={solidRadius} patterns={patterns} />
      <Weight isLiquid={right.isLiquid} x={liquidX} radius={liquidRadius} patterns={patterns} />
      <Stand x={fulcrumX} from={solidX - 12} to={liquidX + 12} />
      <g className="text-[19px] font-black">
        <text x={solidX + solidRadius + 10} y={level - 42} className={tone(left)}>
          {leftShare}
          <tspan x={solidX + solidRadius + 10} dy="21" className="text-[16px]">
            {left.words}
          </tspan>
        </text>
        <text x={liquidX - liquidRadius - 10} y={level - 42} textAnchor="end" className={tone(right)}>
          {rightShare}
          <tspan x={liquidX - liquidRadius - 10} dy="21" className="text-[16px]">
            {right.words}
          </tspan>
        </text>
      </g>
      <g className="fill-soft text-[15px] font-extrabold">
        <text x={crowdsLeft ? fulcrumX + 30 : solidX - 16} y={level + 30}>
          {left.wt.toFixed(1)} %
        </text>
        <text x={crowdsRight ? fulcrumX - 30 : liquidX + 16} y={level + 30} textAnchor="end">
          {right.wt.toFixed(1)} %
        </text>
      </g>
      <text
        x={Math.min(liquidX - 40, Math.max(solidX + 40, fulcrumX))}
        y={level + 60}
        textAnchor="middle"
        className="fill-ink text-[16px] font-black"
      >
        {alloyWt.toFixed(1)} % {element}
      </text>
    </>
  );
};

const Lone = ({ isLiquid, patterns }: { readonly isLiquid: boolean; readonly patterns: string }) => {
  const middle = (frame.left + frame.right) / 2;
  return (
    <>
      <Weight isLiquid={isLiquid} x={middle} radius={frame.fullRadius} patterns={patterns} />
      <Stand x={middle} from={frame.left} to={frame.right} />
      <text
        x={middle}
        y={level + 60}
        textAnchor="middle"
        className={`text-[17px] font-black ${isLiquid ? 'fill-ember' : 'fill-iron'}`}
      >
        all {isLiquid ? 'liquid' : 'solid'}
      </text>
    </>
  );
};

/** Props of {@link PhaseBeam}. */
export interface PhaseBeamProps {
  /** Null where the metal is of one phase. */
  readonly pair: BeamPair | null;
  /** Whether that one phase is the liquid. */
  readonly isLiquid: boolean;
}

/** The lever rule lying down: two weights, as heavy as the two phases, on a beam that stands on the alloy's composition. */
export const PhaseBeam = ({ pair, isLiquid }: PhaseBeamProps) => {
  const patterns = useId();
  return (
    <svg
      viewBox="0 0 430 176"
      role="img"
      aria-label={pair ? sentenceOf(pair) : `All ${isLiquid ? 'liquid' : 'solid'}, one phase.`}
      className="w-full max-w-[460px]"
    >
      <PhasePatterns id={patterns} />
      {pair ? <Balanced pair={pair} patterns={patterns} /> : <Lone isLiquid={isLiquid} patterns={patterns} />}
    </svg>
  );
};
