import type { Alloy, AlloyRevision } from '#shared/contracts/alloy.ts';

/** The approved revision; none until the first is approved. */
export const approvedRevision = ({ revisions }: Pick<Alloy, 'revisions'>): AlloyRevision | undefined =>
  revisions.find(({ status }) => status === 'approved');

/** The newest revision on the way to approval, if it is newer than the approved one. */
export const openRevision = (alloy: Pick<Alloy, 'revisions'>): AlloyRevision | undefined =>
  alloy.revisions.find(({ status }) => status === 'draft' || status === 'checked');

/** The revision named in the address; else the approved one; else the newest. */
export const chooseRevision = (
  alloy: Pick<Alloy, 'revisions'>,
  wanted: string | null,
): AlloyRevision | undefined =>
  alloy.revisions.find(({ number }) => String(number) === wanted) ??
  approvedRevision(alloy) ??
  alloy.revisions[0];

/** The revision just before one, by number. */
export const revisionBefore = (
  { revisions }: Pick<Alloy, 'revisions'>,
  { number }: AlloyRevision,
): AlloyRevision | undefined =>
  revisions.filter((other) => other.number < number).toSorted((a, b) => b.number - a.number)[0];
