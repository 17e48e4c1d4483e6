/** Bands of the thinnest section of a tree, for the studio's tables. */
export const sectionBands = ['thin', 'medium', 'heavy'] as const;

/** One band of thickness. */
export type SectionBand = (typeof sectionBands)[number];

/** The band of a thinnest section in millimetres: thin below 1 mm, medium below 3 mm, heavy from there. */
export const bandOfSection = (millimetres: number): SectionBand => {
  if (millimetres < 1) return 'thin';
  return millimetres < 3 ? 'medium' : 'heavy';
};

/** A band in words. */
export const sectionBandNames: Readonly<Record<SectionBand, string>> = {
  thin: 'under 1 mm',
  medium: '1 to 3 mm',
  heavy: '3 mm and more',
};
