import {
  elementsOf,
  leastWeighingMg,
  toleranceOf,
  weighingStepMg,
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
  readonly wantedG: number;
  /** The most that can be taken of each lot, g. */
  readonly mostG: readonly number[];
  readonly rows: readonly ModelRow[];
  /** What a gram of each lot costs in the plan's order of preference; unitless. */
  readonly costPerG: readonly number[];
  /** What using one more lot costs, in the same. */
  readonly costPerLot: number;
}

/** Returns first, then grain and master alloy, fine metal last. */
const preference: Readonly<Record<LotKind, number>> = {
  returns: 0,
  grain: 1,
  master: 1.5,
  fine: 2,
  scrap: 0,
};

/** Lots of a plan that rounding to weighable masses may move, each by half a step at most; plans use few. */
const roundedLots = 8;

/** How far rounding may move an element, g, for lots whose parts differ by `spread` (a share). */
const roundingG = (spread: number): number => ((weighingStepMg / 1000) * roundedLots * spread) / 2;

const spread = (shares: readonly number[]): number => Math.max(0, ...shares) - Math.min(1, ...shares);

/** The metal wanted, g, and how much of the rounding is kept in hand, as a share. */
interface Scope {
  readonly wantedG: number;
  readonly margin: number;
}

const elementRows = (
  request: ChargeRequest,
  lots: readonly LotOnHand[],
  { wantedG, margin }: Scope,
): readonly ModelRow[] =>
  elementsOf({ targetWt: request.targetWt, lots }).flatMap((element): ModelRow[] => {
    const coefficients = lots.map(({ compositionWt }) => (compositionWt[element] ?? 0) / 100);
    const targetG = ((request.targetWt[element] ?? 0) / 100) * wantedG;
    const toleranceG = (toleranceOf(request, element) / 100) * wantedG;
    const marginG = Math.min(margin * roundingG(spread(coefficients)), toleranceG / 2);
    return [
      {
        name: `${element}_most`,
        limit: { kind: 'element', element, side: 'most' },
        coefficients,
        sense: '<=',
        bound: targetG + toleranceG - marginG,
      },
      {
        name: `${element}_least`,
        limit: { kind: 'element', element, side: 'least' },
        coefficients,
        sense: '>=',
        bound: targetG - toleranceG + marginG,
      },
    ];
  });

const finenessRow = (
  request: ChargeRequest,
  lots: readonly LotOnHand[],
  { wantedG, margin }: Scope,
): ModelRow => {
  const coefficients = lots.map((lot) => lowestPart(lot, request.markedMetal) / 100);
  const markG = (request.markPpt / 1000) * wantedG + margin * roundingG(spread(coefficients));
  return { name: 'fineness', limit: { kind: 'fineness' }, coefficients, sense: '>=', bound: markG };
};

const returnsRow = (request: ChargeRequest, lots: readonly LotOnHand[], wantedG: number): ModelRow => ({
  name: 'returns',
  limit: { kind: 'returns' },
  coefficients: lots.map(({ kind }) => (kind === 'returns' ? 1 : 0)),
  sense: '<=',
  bound: Math.floor((request.returnsShare * wantedG * 1000) / weighingStepMg) * (weighingStepMg / 1000),
});

/** Older returns cost less, so that they go first. */
const costs = (lots: readonly LotOnHand[]): readonly number[] => {
  const byAge = lots
    .filter(({ kind }) => kind === 'returns')
    .map(({ receivedAt }) => receivedAt)
    .sort();
  return lots.map(({ kind, receivedAt }) => {
    const age = kind === 'returns' ? byAge.indexOf(receivedAt) / Math.max(1, byAge.length) : 0;
    return preference[kind] + 0.5 * age;
  });
};

/**
 * Builds the programme of a charge; lots that may not be charged, or hold less than can be weighed, are left out.
 * `margin` tightens the limits by that share of what rounding to weighable masses could undo.
 */
export const buildChargeModel = (request: ChargeRequest, { margin = 0 } = {}): ChargeModel => {
  const wantedG = (Math.round(request.wantedMg / weighingStepMg) * weighingStepMg) / 1000;
  const lots = request.lots.filter(
    ({ kind, balanceMg }) => mayBeCharged(kind) && balanceMg >= leastWeighingMg,
  );
  const wholeSteps = (mg: number): number => (Math.floor(mg / weighingStepMg) * weighingStepMg) / 1000;
  return {
    lots,
    wantedG,
    mostG: lots.map(({ balanceMg }) => Math.min(wantedG, wholeSteps(balanceMg))),
    rows: [
      ...elementRows(request, lots, { wantedG, margin }),
      finenessRow(request, lots, { wantedG, margin }),
      returnsRow(request, lots, wantedG),
    ],
    costPerG: costs(lots),
    costPerLot: 0.02 * wantedG,
  };
};

const term = (coefficient: number, variable: string): string =>
  coefficient === 0 ? '' : ` ${coefficient < 0 ? '-' : '+'} ${Math.abs(coefficient).toFixed(9)} ${variable}`;

/** What each limit is widened by in the elastic programme: `over_…` and `under_…` variables, in grams. */
const slackOf = ({ name, sense }: ModelRow): string => `${sense === '<=' ? '-' : '+'} slack_${name}`;

const rowLine = (row: ModelRow, isElastic: boolean): string =>
  ` ${row.name}:${row.coefficients.map((coefficient, lot) => term(coefficient, `g${lot}`)).join('')}${isElastic ? ` ${slackOf(row)}` : ''} ${row.sense} ${row.bound.toFixed(9)}`;

/**
 * Writes the programme in the CPLEX LP format. The elastic one lets every limit give way at a price, and so always has a
 * solution while there is metal enough: what gives way is what stands in the way.
 */
export const writeChargeModel = (model: ChargeModel, { isElastic = false } = {}): string => {
  const { lots, wantedG, mostG, rows, costPerG, costPerLot } = model;
  const every = lots.map((_, lot) => lot);
  const least = leastWeighingMg / 1000;
  const cost = isElastic
    ? rows.map(({ name }) => ` + slack_${name}`).join('')
    : every.map((lot) => term(costPerG[lot] ?? 0, `g${lot}`) + term(costPerLot, `u${lot}`)).join('');
  return [
    'Minimize',
    ` cost:${cost === '' ? ' 0 g0' : cost}`,
    'Subject To',
    ` total:${every.map((lot) => ` + g${lot}`).join('')} = ${wantedG.toFixed(3)}`,
    ...rows
      .filter(({ coefficients }) => isElastic || coefficients.some((coefficient) => coefficient !== 0))
      .map((row) => rowLine(row, isElastic)),
    ...(isElastic
      ? []
      : every.flatMap((lot) => [
          ` most${lot}: g${lot} - ${(mostG[lot] ?? 0).toFixed(3)} u${lot} <= 0`,
          ` least${lot}: g${lot} - ${least.toFixed(3)} u${lot} >= 0`,
        ])),
    'Bounds',
    ...every.map((lot) => ` 0 <= g${lot} <= ${(mostG[lot] ?? 0).toFixed(3)}`),
    ...(isElastic ? [] : ['Binary', ` ${every.map((lot) => `u${lot}`).join(' ')}`]),
    'End',
    '',
  ].join('\n');
};
