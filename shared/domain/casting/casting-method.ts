/** How the mould is filled. */
export const castingMethods = ['vacuum', 'centrifugal'] as const;

/** One of the studio's ways to fill a mould. */
export type CastingMethod = (typeof castingMethods)[number];

/** The method in the words of the trade. */
export const castingMethodNames: Readonly<Record<CastingMethod, string>> = {
  vacuum: 'vacuum-assisted',
  centrifugal: 'centrifugal',
};
