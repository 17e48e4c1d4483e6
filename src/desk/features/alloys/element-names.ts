/** Elements met in casting alloys, by symbol; the first four are those the phase model holds. */
export const elementNames: Readonly<Record<string, string>> = {
  Ag: 'silver',
  Au: 'gold',
  Cu: 'copper',
  Zn: 'zinc',
  Pd: 'palladium',
  Pt: 'platinum',
  Ni: 'nickel',
  Ge: 'germanium',
  Si: 'silicon',
  In: 'indium',
  Sn: 'tin',
  Ir: 'iridium',
  Ru: 'ruthenium',
  Rh: 'rhodium',
  Co: 'cobalt',
  Fe: 'iron',
  Ga: 'gallium',
  Mn: 'manganese',
  B: 'boron',
  P: 'phosphorus',
};

/** An element's name in words; the symbol itself where no name is held. */
export const elementName = (symbol: string): string => elementNames[symbol] ?? symbol;

/** A word with its first letter large, to begin a sentence or a label. */
export const capitalised = (words: string): string => words.charAt(0).toUpperCase() + words.slice(1);

/** wt% as people write it: at most three decimals, none idle. */
export const writeWt = (wt: number): string => String(Number(wt.toFixed(3)));

/** A composition with its tolerances in one line, largest part first: `Ag 92.5 ±0.3, Cu 7.5 ±0.3`. */
export const writeComposition = (
  compositionWt: Readonly<Record<string, number>>,
  toleranceWt: Readonly<Record<string, number>> = {},
): string =>
  Object.entries(compositionWt)
    .toSorted(([, a], [, b]) => b - a)
    .map(([symbol, wt]) => {
      const tolerance = toleranceWt[symbol];
      return tolerance ? `${symbol} ${writeWt(wt)} ±${writeWt(tolerance)}` : `${symbol} ${writeWt(wt)}`;
    })
    .join(', ');
