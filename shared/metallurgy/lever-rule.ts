/** The two weights on a beam that balances at `overall`, its ends at the compositions of solid and liquid (wt% of one element). */
export interface LeverFractions {
  readonly solid: number;
  readonly liquid: number;
}

/** The lever rule: mass fractions of solid and liquid from three compositions on one tie line; RangeError off the line. */
export const leverRule = (at: {
  readonly overall: number;
  readonly solid: number;
  readonly liquid: number;
}): LeverFractions => {
  const span = at.solid - at.liquid;
  const solid = (at.overall - at.liquid) / span;
  if (!(solid >= 0 && solid <= 1))
    throw new RangeError('The overall composition must lie between solid and liquid.');
  return { solid, liquid: 1 - solid };
};
