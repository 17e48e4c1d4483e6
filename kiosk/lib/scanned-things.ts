/** What a terminal may be shown a code of. */
export type ScannedThing = 'flask' | 'lot';

/** The words of the scanning pieces for each. */
export const scanWords: Readonly<
  Record<
    ScannedThing,
    { readonly show: string; readonly typeTitle: string; readonly label: string; readonly find: string }
  >
> = {
  flask: {
    show: 'Show me a flask',
    typeTitle: 'Type the flask’s number',
    label: 'Flask number',
    find: 'Find this flask',
  },
  lot: {
    show: 'Show me its label',
    typeTitle: 'Type the lot’s number',
    label: 'Lot number',
    find: 'Find this lot',
  },
};
