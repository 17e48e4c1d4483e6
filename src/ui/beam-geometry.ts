/** One tie line through an alloy, told by the element that balances it. */
export interface MeltBalance {
  /** The element on whose content the beam balances, such as "copper". */
  readonly element: string;
  /** Its content in the alloy, in the solid and in the liquid, in per cent by mass. */
  readonly alloyWt: number;
  readonly solidWt: number;
  readonly liquidWt: number;
  /** Share of the mass that is solid, 0 to 1. */
  readonly solidMassFraction: number;
}

/** Where the parts of the beam are drawn: the ends of the beam, its fulcrum, and the radii of the two weights. */
export interface BeamGeometry {
  readonly solidX: number;
  readonly liquidX: number;
  readonly fulcrumX: number;
  readonly solidRadius: number;
  readonly liquidRadius: number;
}

/** Left and right end of the beam, and the radius of a weight that is the whole melt. */
export interface BeamFrame {
  readonly left: number;
  readonly right: number;
  readonly fullRadius: number;
}

const clampShare = (value: number): number => Math.min(1, Math.max(0, value));

/**
 * Draws the lever rule: solid at the left end, liquid at the right, arms as long as the differences of composition
 * from the alloy's, areas of the weights as the masses, so that mass × arm is equal on both sides. Where solid and
 * liquid have the same composition there are no arms to draw and the fulcrum is placed by the masses.
 */
export const beamGeometry = (balance: MeltBalance, { left, right, fullRadius }: BeamFrame): BeamGeometry => {
  const solidShare = clampShare(balance.solidMassFraction);
  const solidArm = Math.abs(balance.alloyWt - balance.solidWt);
  const liquidArm = Math.abs(balance.liquidWt - balance.alloyWt);
  const span = solidArm + liquidArm;
  const armShare = span > 1e-6 ? solidArm / span : 1 - solidShare;
  return {
    solidX: left,
    liquidX: right,
    fulcrumX: left + armShare * (right - left),
    solidRadius: fullRadius * Math.sqrt(solidShare),
    liquidRadius: fullRadius * Math.sqrt(1 - solidShare),
  };
};

/** Whole per cents of solid and liquid that add up to 100 and never call a trace nothing. */
export const phasePercents = (solidMassFraction: number): readonly [string, string] => {
  const solid = clampShare(solidMassFraction) * 100;
  if (solid > 0 && solid < 1) return ['under 1 %', 'over 99 %'];
  if (solid > 99 && solid < 100) return ['over 99 %', 'under 1 %'];
  const rounded = Math.round(solid);
  return [`${rounded} %`, `${100 - rounded} %`];
};
