import { AppError } from '../errors.ts';
import type { LoadedCasting } from './load-casting.ts';

/** Refuses a casting whose alloy revision is not, or no longer, approved: no card opens on its figures. */
export const refuseUnapprovedAlloy = ({ alloyRevision }: LoadedCasting): void => {
  if (alloyRevision.status === 'approved') return;
  throw new AppError(
    'alloy-not-approved',
    `Revision ${alloyRevision.number} of ${alloyRevision.alloy.name} is not approved. Ask the owner to approve it or to plan another.`,
  );
};
