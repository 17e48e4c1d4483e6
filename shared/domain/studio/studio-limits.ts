/** The limits at which a pour card stops or marks a departure; the owner edits them. */
export interface StudioLimits {
  /** How far the charge may be from the planned metal, as a share of it. */
  readonly chargeTolerance: number;
  /** The largest share of returns in a charge. */
  readonly returnsShare: number;
  /** The melt loss, as a share of the metal in, above which the melt is marked. */
  readonly lossShare: number;
  /** The hottest the studio's furnaces go, °C: a higher reading is refused. */
  readonly furnaceMaxC: number;
  /** How far above the pour window a reading is questioned before it is stored, °C. */
  readonly questionAboveC: number;
  /** How many times over its limit a departure wants a second person's sign. */
  readonly countersignFactor: number;
}

/**
 * What a new studio begins with. Returns: 50 % (trade suppliers' published advice). Loss: 0.5 % (common practice, no source).
 * Charge tolerance, furnace maximum, questioning margin and countersign factor: the studio's own choice, no source.
 */
export const defaultStudioLimits: StudioLimits = {
  chargeTolerance: 0.02,
  returnsShare: 0.5,
  lossShare: 0.005,
  furnaceMaxC: 1400,
  questionAboveC: 120,
  countersignFactor: 1.5,
};
