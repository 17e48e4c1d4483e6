import type { ChargeRequest } from './charge-request.ts';
import type { Assay, LotOnHand, Parts } from './lot.ts';

/** A pot of metal already melted, and the alloy it is to become. */
export interface PotChange {
  readonly pot: Assay & { readonly massMg: number };
  readonly targetWt: Parts;
  readonly toleranceWt: Parts;
  readonly markedMetal: 'Ag' | 'Au';
  readonly markPpt: number;
  readonly lots: readonly LotOnHand[];
}

/** The most metal added to a pot, as a multiple of it: a crucible holds no more. */
const mostAdded = 20;

/**
 * What to add to a pot so that every element comes right: a charge whose pot is in the crucible already and whose whole
 * may grow, by as little as will do. Returns are not limited, for the pot itself is what is being put right.
 */
export const potRequest = ({ pot, ...alloy }: PotChange): ChargeRequest => ({
  ...alloy,
  wantedMg: pot.massMg,
  overMg: pot.massMg * mostAdded,
  weighed: [
    {
      lot: { ...pot, id: 'pot', code: '', name: 'the pot', kind: 'grain', balanceMg: 0, receivedAt: '' },
      massMg: pot.massMg,
    },
  ],
  returnsShare: 1,
});
