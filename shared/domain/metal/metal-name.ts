const metalNames: Readonly<Record<string, string>> = {
  Ag: 'silver',
  Au: 'gold',
  Cu: 'copper',
  Zn: 'zinc',
  Ni: 'nickel',
  Pd: 'palladium',
  Pt: 'platinum',
};

/** A metal's name in words, its symbol where there is none. */
export const metalName = (element: string): string => metalNames[element] ?? element;
