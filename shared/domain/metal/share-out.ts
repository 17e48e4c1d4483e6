import { addContents, contentsOf, massOfContents, partsOfContents, type Contents } from './contents.ts';

/** A mass with what it holds, whole milligrams. */
export interface Portion {
  readonly massMg: number;
  readonly contentsMg: Contents;
}

/**
 * Shares what is in a crucible out to loss, button and castings, so that the three hold exactly what went in; the castings
 * take what rounding leaves, or the button where nothing was cast. Null when button and loss come to more than there is.
 */
export const shareOut = (
  contentsMg: Contents,
  { buttonMg, lossMg }: { readonly buttonMg: number; readonly lossMg: number },
): Readonly<Record<'loss' | 'button' | 'castings', Portion>> | null => {
  const massMg = massOfContents(contentsMg);
  const castMg = massMg - buttonMg - lossMg;
  if (castMg < 0) return null;
  const parts = partsOfContents(contentsMg);
  const loss = lossMg === massMg ? contentsMg : contentsOf(lossMg, parts);
  const afterLoss = addContents(contentsMg, loss, -1);
  const button = castMg === 0 ? afterLoss : contentsOf(buttonMg, parts);
  return {
    loss: { massMg: lossMg, contentsMg: loss },
    button: { massMg: buttonMg, contentsMg: button },
    castings: { massMg: castMg, contentsMg: addContents(afterLoss, button, -1) },
  };
};
