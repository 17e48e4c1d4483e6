import type { CastingState } from '#shared/domain/casting/casting-state.ts';

/** Props of {@link SmallFlask}. */
export interface SmallFlaskProps {
  /** The middle of its foot. */
  readonly x: number;
  readonly y: number;
  readonly state: CastingState;
}

// How far it has come to its heat, as a filled height: cold flasks are empty outlines, a holding one is full.
const fills: Readonly<Partial<Record<CastingState, number>>> = { 'burning-out': 15, holding: 30 };

/** A flask that waits for its pour, filled with ember as far as it has come: outline, half, full. */
export const SmallFlask = ({ x, y, state }: SmallFlaskProps) => {
  const fill = fills[state] ?? 0;
  return (
    <g transform={`translate(${x} ${y - 6})`}>
      <path d="M-15 -30 V0 A15 5 0 0 0 15 0 V-30 Z" className="fill-panel" />
      {fill > 0 ? (
        <path
          d={`M-15 ${-fill} V0 A15 5 0 0 0 15 0 V${-fill} Z`}
          className="fill-ember-fill"
          fillOpacity="0.75"
        />
      ) : null}
      <path d="M-15 -30 V0 A15 5 0 0 0 15 0 V-30" className="stroke-ink" strokeWidth="2.5" />
      <ellipse cy="-30" rx="15" ry="5" className="fill-panel stroke-ink" strokeWidth="2.5" />
      <ellipse cy="-30" rx="4.5" ry="1.5" className="fill-ink" />
    </g>
  );
};
