import { isStore, type MetalPlace, type MovementKind } from './ledger.ts';

/** What moved of one element between two places, summed: before the month, or within it. */
export interface Flow {
  readonly element: string;
  readonly isBefore: boolean;
  readonly from: MetalPlace;
  readonly to: MetalPlace;
  /** What the movement was, or what the movement was that it corrects. */
  readonly kind: MovementKind;
  readonly mg: number;
}

/** What new assays changed in what is on hand of one element. */
export interface Reassay {
  readonly element: string;
  readonly isBefore: boolean;
  readonly mg: number;
}

/**
 * One element's month, mg. The stores: opening + received − issued + returned − dispatched + counted + reassayed = closing.
 * The crucibles: crucibleOpening + issued − cast − returned − lost = crucibleClosing.
 */
export interface MonthOfMetal {
  readonly element: string;
  readonly opening: number;
  readonly received: number;
  readonly issued: number;
  readonly returned: number;
  readonly dispatched: number;
  readonly counted: number;
  readonly reassayed: number;
  readonly closing: number;
  readonly crucibleOpening: number;
  readonly cast: number;
  readonly lost: number;
  readonly crucibleClosing: number;
}

type Line = 'received' | 'issued' | 'returned' | 'dispatched' | 'counted' | 'cast' | 'lost';

const lineOfPlace: Readonly<Partial<Record<MetalPlace, Line>>> = {
  supplier: 'received',
  refiner: 'dispatched',
  adjustment: 'counted',
  castings: 'cast',
  loss: 'lost',
};

/** The line a movement belongs to, and the way in which it is counted there. */
const lineOf = ({ from, to, kind }: Flow): { readonly line: Line; readonly sign: 1 | -1 } => {
  const outside = lineOfPlace[from] ?? lineOfPlace[to];
  if (outside === 'received' || outside === 'counted')
    return { line: outside, sign: isStore(to) || to === 'crucible' ? 1 : -1 };
  if (outside) return { line: outside, sign: lineOfPlace[to] ? 1 : -1 };
  if (kind === 'returned') return { line: 'returned', sign: isStore(to) ? 1 : -1 };
  return { line: 'issued', sign: to === 'crucible' ? 1 : -1 };
};

const storeChange = ({ from, to, mg }: Flow): number => (isStore(to) ? mg : 0) - (isStore(from) ? mg : 0);
const crucibleChange = ({ from, to, mg }: Flow): number =>
  (to === 'crucible' ? mg : 0) - (from === 'crucible' ? mg : 0);

const sum = <Item>(items: readonly Item[], of: (item: Item) => number): number =>
  items.reduce((total, item) => total + of(item), 0);

const monthOf = (element: string, flows: readonly Flow[], reassays: readonly Reassay[]): MonthOfMetal => {
  const before = flows.filter(({ isBefore }) => isBefore);
  const within = flows.filter(({ isBefore }) => !isBefore);
  const lineSum = (line: Line): number =>
    sum(within, (flow) => {
      const found = lineOf(flow);
      return found.line === line ? found.sign * flow.mg : 0;
    });
  const opening = sum(before, storeChange) + sum(reassays, ({ isBefore, mg }) => (isBefore ? mg : 0));
  const reassayed = sum(reassays, ({ isBefore, mg }) => (isBefore ? 0 : mg));
  const crucibleOpening = sum(before, crucibleChange);
  return {
    element,
    opening,
    received: lineSum('received'),
    issued: lineSum('issued'),
    returned: lineSum('returned'),
    dispatched: lineSum('dispatched'),
    counted: lineSum('counted'),
    reassayed,
    closing: opening + sum(within, storeChange) + reassayed,
    crucibleOpening,
    cast: lineSum('cast'),
    lost: lineSum('lost'),
    crucibleClosing: crucibleOpening + sum(within, crucibleChange),
  };
};

/** Precious metals first, then the rest by their symbols, what certificates leave unnamed last. */
const rank = (element: string): string => {
  const first = ['Au', 'Ag', 'Pt', 'Pd'].indexOf(element);
  if (first >= 0) return `0${first}`;
  return element === 'other' ? '2' : `1${element}`;
};

/** A month of metal, element by element; to the milligram, for every line is a sum of whole milligrams. */
export const reconcile = (flows: readonly Flow[], reassays: readonly Reassay[]): readonly MonthOfMetal[] => {
  const elements = [...new Set([...flows, ...reassays].map(({ element }) => element))];
  const of = <Item extends { readonly element: string }>(items: readonly Item[], element: string) =>
    items.filter((item) => item.element === element);
  return elements
    .sort((a, b) => rank(a).localeCompare(rank(b)))
    .map((element) => monthOf(element, of(flows, element), of(reassays, element)));
};

/** All elements of a month together. */
export const totalOfMonth = (months: readonly MonthOfMetal[]): MonthOfMetal => {
  const all = (of: (month: MonthOfMetal) => number): number => sum(months, of);
  return {
    element: 'all',
    opening: all(({ opening }) => opening),
    received: all(({ received }) => received),
    issued: all(({ issued }) => issued),
    returned: all(({ returned }) => returned),
    dispatched: all(({ dispatched }) => dispatched),
    counted: all(({ counted }) => counted),
    reassayed: all(({ reassayed }) => reassayed),
    closing: all(({ closing }) => closing),
    crucibleOpening: all(({ crucibleOpening }) => crucibleOpening),
    cast: all(({ cast }) => cast),
    lost: all(({ lost }) => lost),
    crucibleClosing: all(({ crucibleClosing }) => crucibleClosing),
  };
};
