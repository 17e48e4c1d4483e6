/** Families of alloys that share flask temperatures, crucibles and cautions. */
export const alloyFamilies = ['silver', 'yellow-gold', 'rose-gold', 'white-gold'] as const;

/** One family of alloys. */
export type AlloyFamily = (typeof alloyFamilies)[number];

/** A family's name in words. */
export const alloyFamilyNames: Readonly<Record<AlloyFamily, string>> = {
  silver: 'silver',
  'yellow-gold': 'yellow gold',
  'rose-gold': 'rose gold',
  'white-gold': 'white gold',
};

/** The metal whose fineness an alloy is marked by. */
export const markedMetal = (family: AlloyFamily): 'Ag' | 'Au' => (family === 'silver' ? 'Ag' : 'Au');
