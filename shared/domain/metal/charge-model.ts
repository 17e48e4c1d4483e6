import {
  elementsOf,
  leastWeighingMg,
  massOfLines,
  toleranceOf,
  weighingStepMg,
  type ChargeLine,
  type ChargeRequest,
} from './charge-request.ts';
import { lowestPart, mayBeCharged, type LotKind, type LotOnHand } from './lot.ts';

/** The limits a charge must hold, by the name a plan that fails is explained with. */
export type ChargeLimit =
  | { readonly kind: 'element'; readonly element: string; readonly side: 'most' | 'least' }
  | { readonly kind: 'fineness' }
  | { readonly kind: 'returns' };

/** One row of the linear programme: Σ coefficient · grams of a lot, against a bound. */
export interface ModelRow {
  readonly name: string;
  readonly limit: ChargeLimit;
  readonly coefficients: readonly number[];
  readonly sense: '<=' | '>=';
  readonly bound: number;
}

/** A charge as a mixed-integer programme: grams of each lot, and whether it is used. */
export interface ChargeModel {
  readonly lots: readonly LotOnHand[];
  /** What is still to be weighed, g, and how far that may be above and below. */
  readonly wantedG: number;
  readonly overG: number;
  readonly underG: number;
  /** The most that can be taken of each lot, g. */
  readonly mostG: readonly number[];
  readonly rows: readonly ModelRow[];
  /** What a gram of each lot costs in the plan's order of preference; unitless. */
  readonly costPerG: readonly number[];
  /** What using each lot at all costs, in the same. */
  readonly costPerLot: readonly number[];
}

/** What a gram beyond, or short of, the wanted mass costs: more than any gram of metal on hand. */
export const costOffG = 10;

/** What a gram of metal that would have to be bought costs: more than any way to do without. */
const costBought = 100;

/** Returns first, then grain and master alloy, fine metal last. */
const preference: Readonly<Record<LotKind, number>> = {
  returns: 0,
  grain: 1,
  master: 1.5,
  fine: 2,
  scrap: 0,
};

/** What using one more lot costs, as a share of the whole. */
const lotShare = 0.02;

/** Lots of a plan that rounding to weighable masses may move, each by half a step at most; plans use few. */
const roundedLots = 8;

/** How far rounding may move an element, g, for lots whose parts differ by `spread` (a share). */
const roundingG = (spread: number): number => ((weighingStepMg / 1000) * roundedLots * spread) / 2;

const spread = (shares: readonly number[]): number => Math.max(0, ...shares) - Math.min(1, ...shares);

interface Scope {
  readonly request: ChargeRequest;
  readonly lots: readonly LotOnHand[];
  readonly weighed: readonly ChargeLine[];
  /** How much of the rounding is kept in hand, as a share. */
  readonly margin: number;
}

/** A limit on a share of the whole charge, whatever the whole comes to: Σ (share − limit) · g ≶ 0, crucible included. */
const shareRow = (
  { lots, weighed, margin, request }: Scope,
  {
    name,
    limit,
    sense,
    atMost,
    share,
  }: Pick<ModelRow, 'name' | 'limit' | 'sense'> & {
    readonly atMost: number;
    readonly share: (lot: LotOnHand) => number;
  },
  roomG = Number.POSITIVE_INFINITY,
): ModelRow => {
  const already = weighed.reduce((sum, { lot, massMg }) => sum + ((share(lot) - atMost) * massMg) / 1000, 0);
  const shares = lots.map(share);
  // Half the room is kept, so that a narrow limit does not vanish.
  const marginG = Math.min(margin * roundingG(spread(shares)), roomG / 2, request.wantedMg / 1000);
  return {
    name,
    limit,
    sense,
    coefficients: shares.map((each) => each - atMost),
    bound: sense === '<=' ? -already - marginG : -already + marginG,
  };
};

const elementRows = (scope: Scope): readonly ModelRow[] => {
  const { request } = scope;
  return elementsOf(request).flatMap((element): ModelRow[] => {
    const target = request.targetWt[element] ?? 0;
    const tolerance = toleranceOf(request, element);
    const roomG = (tolerance / 100) * (request.wantedMg / 1000);
    const share = ({ compositionWt }: LotOnHand): number => (compositionWt[element] ?? 0) / 100;
    const row = (side: 'most' | 'least'): ModelRow =>
      shareRow(
        scope,
        {
          name: `${element}_${side}`,
          limit: { kind: 'element', element, side },
          sense: side === 'most' ? '<=' : '>=',
          atMost: (side === 'most' ? target + tolerance : target - tolerance) / 100,
          share,
        },
        roomG,
      );
    return [row('most'), row('least')];
  });
};

const finenessRow = (scope: Scope): ModelRow =>
  shareRow(scope, {
    name: 'fineness',
    limit: { kind: 'fineness' },
    sense: '>=',
    atMost: scope.request.markPpt / 1000,
    share: (lot) => lowestPart(lot, scope.request.markedMetal) / 100,
  });

const returnsRow = (scope: Scope): ModelRow =>
  shareRow(
    scope,
    {
      name: 'returns',
      limit: { kind: 'returns' },
      sense: '<=',
      atMost: scope.request.returnsShare,
      share: ({ kind }) => (kind === 'returns' ? 1 : 0),
    },
    // Whole weighings settle it: half a step is all that rounding can add.
    weighingStepMg / 1000,
  );

/** Older returns cost less, so that they go first. */
const costsPerG = (lots: readonly LotOnHand[]): readonly number[] => {
  const byAge = lots
    .filter(({ kind }) => kind === 'returns')
    .map(({ receivedAt }) => receivedAt)
    .sort();
  return lots.map(({ kind, receivedAt, isBought }) => {
    const age = kind === 'returns' ? byAge.indexOf(receivedAt) / Math.max(1, byAge.length) : 0;
    return preference[kind] + 0.5 * age + (isBought ? costBought : 0);
  });
};

const wholeStepsG = (mg: number): number => (Math.floor(mg / weighingStepMg) * weighingStepMg) / 1000;

/**
 * Builds the programme of a charge; lots that may not be charged, or hold less than can be weighed, are left out.
 * `margin` tightens the limits by that share of what rounding to weighable masses could undo.
 */
export const buildChargeModel = (request: ChargeRequest, { margin = 0 } = {}): ChargeModel => {
  const { weighed = [], overMg = 0, underMg = 0, wantedMg } = request;
  const lots = request.lots.filter(
    ({ kind, balanceMg }) => mayBeCharged(kind) && balanceMg >= leastWeighingMg,
  );
  const missingMg = Math.max(0, wantedMg - massOfLines(weighed));
  const wantedG = (Math.round(missingMg / weighingStepMg) * weighingStepMg) / 1000;
  const overG = wholeStepsG(Math.max(0, Math.min(overMg, overMg + wantedMg - massOfLines(weighed))));
  const scope: Scope = { request, lots, weighed, margin };
  const used = new Set(weighed.map(({ lot }) => lot.id));
  return {
    lots,
    wantedG,
    overG,
    underG: Math.min(wantedG, wholeStepsG(underMg)),
    mostG: lots.map(({ balanceMg }) => Math.min(wantedG + overG, wholeStepsG(balanceMg))),
    rows: [...elementRows(scope), finenessRow(scope), returnsRow(scope)],
    costPerG: costsPerG(lots),
    costPerLot: lots.map(({ id }) => (used.has(id) ? 0 : (lotShare * wantedMg) / 1000)),
  };
};

/** What some lines cost in a model's order of preference. */
export const costOfLines = (
  { lots, costPerG, costPerLot, wantedG }: ChargeModel,
  lines: readonly ChargeLine[],
): number =>
  lines.reduce(
    (sum, { lot, massMg }) => {
      const index = lots.findIndex(({ id }) => id === lot.id);
      return sum + ((costPerG[index] ?? 0) * massMg) / 1000 + (costPerLot[index] ?? 0);
    },
    costOffG * Math.abs(massOfLines(lines) / 1000 - wantedG),
  );

/** The same programme with only some of its lots. */
export const restrictModel = (model: ChargeModel, kept: readonly number[]): ChargeModel => {
  const pick = <Value>(values: readonly Value[]): readonly Value[] =>
    kept.flatMap((index) => {
      const value = values[index];
      return value === undefined ? [] : [value];
    });
  return {
    ...model,
    lots: pick(model.lots),
    mostG: pick(model.mostG),
    costPerG: pick(model.costPerG),
    costPerLot: pick(model.costPerLot),
    rows: model.rows.map((row) => ({ ...row, coefficients: pick(row.coefficients) })),
  };
};
