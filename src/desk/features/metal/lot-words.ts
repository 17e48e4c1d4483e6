import type { Lot } from '#shared/contracts/lot.ts';
import type { MetalPlace, MovementKind } from '#shared/domain/metal/ledger.ts';
import { formatFineness, mixFineness, type Assay } from '#shared/domain/metal/lot.ts';
import { metalName } from '#shared/domain/metal/metal-name.ts';

/** The precious metal of a lot and its fineness, parts per thousand: expected, and at the certificate's lower bound. */
export interface LotFineness {
  readonly metal: 'Au' | 'Ag';
  readonly expected: number;
  readonly worst: number;
}

/** The fineness of a lot by its gold, or by its silver where it holds no gold; null where it holds neither. */
export const finenessOf = (assay: Assay): LotFineness | null => {
  const metal = (['Au', 'Ag'] as const).find((each) => (assay.compositionWt[each] ?? 0) > 0);
  return metal ? { metal, ...mixFineness([{ assay, massMg: 1 }], metal) } : null;
};

/** A fineness in words: `750.0 gold, at least 748.0`. */
export const finenessWords = ({ metal, expected, worst }: LotFineness): string => {
  const least = worst < expected ? `, at least ${formatFineness(worst)}` : '';
  return `${formatFineness(expected)} ${metalName(metal)}${least}`;
};

const listed = (parts: readonly string[]): string =>
  parts.length < 2 ? parts.join('') : `${parts.slice(0, -1).join(', ')} and ${parts.at(-1)}`;

const lotsIn = (count: number): string => (count === 1 ? '1 lot' : `${count} lots`);

/** What is on hand of each precious metal and of the rest together, mg, leaving out what there is none of. */
const totalsOf = (lots: readonly Pick<Lot, 'contentsMg'>[]): readonly (readonly [string, number])[] => {
  const sums = { gold: 0, silver: 0, 'other metals': 0 };
  for (const { contentsMg } of lots) {
    for (const [element, mg] of Object.entries(contentsMg)) {
      sums[element === 'Au' ? 'gold' : element === 'Ag' ? 'silver' : 'other metals'] += mg;
    }
  }
  return Object.entries(sums).filter(([, mg]) => mg > 0);
};

/** What is on hand by metal in one sentence; `mass` writes grams in the studio's unit. */
export const totalsSentence = (
  lots: readonly Pick<Lot, 'contentsMg' | 'quarantineReason'>[],
  mass: (grams: number) => string,
): string => {
  if (lots.length === 0) return 'No metal is on hand.';
  const metals = totalsOf(lots).map(([name, mg]) => `${mass(mg / 1000)} of ${name}`);
  const kept = lots.filter(({ quarantineReason }) => quarantineReason !== null).length;
  const aside = kept === 0 ? '' : `, ${kept} of them in quarantine`;
  return `${listed(metals)} in ${lotsIn(lots.length)}${aside}.`;
};

const dayMs = 86_400_000;

/** How long ago something was, in words: `today`, `1 day`, `12 days`, `3 months`, `2 years`. */
export const ageWords = (iso: string, nowMs: number): string => {
  const days = Math.floor((nowMs - Date.parse(iso)) / dayMs);
  const say = (count: number, unit: string): string => `${count} ${unit}${count === 1 ? '' : 's'}`;
  if (days < 1) return 'today';
  if (days < 60) return say(days, 'day');
  return days < 730 ? say(Math.floor(days / 30.44), 'month') : say(Math.floor(days / 365.25), 'year');
};

/** A place of the ledger as people name it. */
export const placeNames: Readonly<Record<MetalPlace, string>> = {
  stock: 'stock',
  returns: 'returns',
  scrap: 'scrap',
  supplier: 'supplier',
  crucible: 'crucible',
  castings: 'castings',
  refiner: 'refiner',
  loss: 'loss',
  adjustment: 'difference found',
};

/** What a movement was, in words. */
export const movementNames: Readonly<Record<MovementKind, string>> = {
  received: 'received',
  'weighed-in': 'weighed in',
  'taken-out': 'taken out again',
  cast: 'cast',
  returned: 'returned',
  lost: 'lost',
  dispatched: 'sent to refine',
  counted: 'counted',
  corrected: 'corrected',
};
