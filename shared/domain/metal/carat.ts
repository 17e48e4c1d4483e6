/** Parts of gold in 24. */
export type Carat = number;

/** Fineness in parts per thousand of a carat: 18 ct is 750, 14 ct is 583.3. */
export const finenessOfCarat = (carat: Carat): number => (carat / 24) * 1000;

/**
 * Metal to add to a pot so that its fineness becomes `targetPpt`, in the unit of `mass`:
 * m (Ft − Fs) / (Fa − Ft), parts per thousand. Throws a RangeError where no addition of that fineness can get there.
 */
export const additionFor = (pot: {
  readonly mass: number;
  readonly fromPpt: number;
  readonly targetPpt: number;
  readonly additionPpt: number;
}): number => {
  const { mass, fromPpt, targetPpt, additionPpt } = pot;
  if (targetPpt === fromPpt) return 0;
  const addition = (mass * (targetPpt - fromPpt)) / (additionPpt - targetPpt);
  if (!Number.isFinite(addition) || addition < 0) {
    throw new RangeError('An addition of that fineness moves the pot the other way, or not at all.');
  }
  return addition;
};
