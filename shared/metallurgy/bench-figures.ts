import { meltingRange } from './melting-range.ts';
import type { Composition, MeltingRange, Outcome } from './types.ts';

/** Solder should flow at least this far below the parent metal's limit, °C (Corti, Carat gold solders for jewellery making). */
export const SOLDER_MARGIN_C = 20;

/** Furnace work keeps this far below the temperature at which anything melts, °C; common practice, no source. */
export const FURNACE_MARGIN_C = 10;

/** A limit: where melting starts, and how far below it to stay. */
export interface BenchLimit {
  readonly temperatureC: number | null;
  readonly marginC: number;
  readonly stayBelowC: number | null;
  readonly basis: string;
}

/** A span to work in; both ends null where there is none, and `basis` says why. */
export interface BenchWindow {
  readonly fromC: number | null;
  readonly toC: number | null;
  readonly marginC: number;
  readonly basis: string;
}

/** What the phase diagram means at the bench. */
export interface BenchFigures {
  readonly torchCeilingAsCastC: BenchLimit;
  readonly torchCeilingHomogenisedC: BenchLimit;
  readonly solutionWindowC: BenchWindow;
  readonly annealWindowC: BenchWindow;
}

interface AnnealPractice {
  readonly holds: (wt: (element: string) => number) => boolean;
  readonly fromC: number;
  readonly toC: number;
  readonly metal: string;
}

/** Anneal temperatures as trade sheets print them; the metal's own sheet comes first. */
const ANNEALS: readonly AnnealPractice[] = [
  {
    holds: (wt) => wt('Ag') >= 80 && wt('Ag') < 99,
    fromC: 593,
    toC: 649,
    metal: 'sterling and like silvers',
  },
  { holds: (wt) => wt('Au') >= 70 && wt('Au') < 80, fromC: 650, toC: 704, metal: '18 ct golds' },
  { holds: (wt) => wt('Au') >= 33 && wt('Au') < 65, fromC: 600, toC: 675, metal: '9 to 14 ct golds' },
];

const limit = (temperatureC: number | null, basis: string): BenchLimit => ({
  temperatureC,
  marginC: SOLDER_MARGIN_C,
  stayBelowC: temperatureC === null ? null : temperatureC - SOLDER_MARGIN_C,
  basis,
});

const noWindow = (basis: string): BenchWindow => ({
  fromC: null,
  toC: null,
  marginC: FURNACE_MARGIN_C,
  basis,
});

const solutionWindow = ({ solvusC, asCastSolidusC }: MeltingRange): BenchWindow => {
  if (solvusC === null)
    return noWindow('No solvus: the solid is of one kind throughout, or never becomes so.');
  if (asCastSolidusC === null)
    return noWindow('The as-cast limit is not known, so no upper end can be named.');
  const toC = asCastSolidusC - FURNACE_MARGIN_C;
  if (toC <= solvusC) {
    return noWindow(
      `The solvus (${solvusC.toFixed(0)} °C) leaves no room below the as-cast limit: homogenise first, or dissolve in part.`,
    );
  }
  const basis = `From the computed solvus to ${FURNACE_MARGIN_C} °C below the as-cast limit; metal below the solvus dissolves only in part.`;
  return { fromC: solvusC, toC, marginC: FURNACE_MARGIN_C, basis };
};

const annealWindow = (composition: Composition, { asCastSolidusC, solidusC }: MeltingRange): BenchWindow => {
  const practice = ANNEALS.find(({ holds }) => holds((element) => composition[element] ?? 0));
  if (!practice) return noWindow('No anneal is held for this kind of metal.');
  const ceiling = (asCastSolidusC ?? solidusC) - FURNACE_MARGIN_C;
  if (ceiling <= practice.fromC)
    return noWindow('The usual anneal comes too near to melting for this alloy.');
  return {
    fromC: practice.fromC,
    toC: Math.min(practice.toC, ceiling),
    marginC: FURNACE_MARGIN_C,
    basis: `Trade sheets for ${practice.metal}, kept ${FURNACE_MARGIN_C} °C below the as-cast limit; the maker's own sheet comes first.`,
  };
};

/** Torch ceilings, solution and anneal windows of an alloy, °C, each with its margin and basis. */
export const benchFigures = (composition: Composition): Outcome<BenchFigures> => {
  const range = meltingRange(composition);
  if (!range.withinModel) return range;
  return {
    withinModel: true,
    torchCeilingAsCastC: limit(
      range.asCastSolidusC,
      range.asCastSolidusC === null
        ? 'Not computed: the last liquid leaves the model. Use a measured limit.'
        : 'Where the last metal to freeze in the mould melts again (Scheil-Gulliver).',
    ),
    torchCeilingHomogenisedC: limit(
      range.solidusC,
      'Equilibrium solidus; holds only for metal homogenised by a long anneal.',
    ),
    solutionWindowC: solutionWindow(range),
    annealWindowC: annealWindow(composition, range),
  };
};

/** The solders that flow at least `marginC` below a ceiling, hottest first, each with its clearance in °C. */
export const soldersBelow = <T extends { readonly liquidusC: number }>(
  ceilingC: number,
  solders: readonly T[],
  marginC: number = SOLDER_MARGIN_C,
): readonly (T & { readonly clearanceC: number })[] =>
  solders
    .filter((solder) => solder.liquidusC <= ceilingC - marginC)
    .map((solder) => ({ ...solder, clearanceC: ceilingC - solder.liquidusC }))
    .sort((a, b) => a.clearanceC - b.clearanceC);
