import type { Celsius, Grams } from '#shared/lib/units.ts';
import type { AlloyFamily } from '../alloy/alloy-family.ts';
import type { AlloyFigures } from '../alloy/alloy-figures.ts';
import type { QuenchRule } from '../alloy/quench-rule.ts';
import type { CastingMethod } from '../casting/casting-method.ts';
import { bandOfSection } from '../casting/section-band.ts';
import { chooseCooling, type ChosenCooling } from '../instrument/choose-cooling.ts';
import type { ProcessTables, Range } from '../studio/process-tables.ts';
import type { Basis } from './basis.ts';
import { explainFigures } from './explain-figures.ts';
import { secondsUntil } from './flask-cooling.ts';

/** The figures whose origin a pour card can show. */
export type FigureKey =
  | 'liquidus'
  | 'solidus'
  | 'pour'
  | 'meltHold'
  | 'flaskHold'
  | 'flaskPour'
  | 'pourWindow'
  | 'metalWanted'
  | 'quench';

/** Every number a terminal shows for one flask, computed once when the card is opened. */
export interface CardFigures {
  readonly liquidusC: Celsius;
  readonly solidusC: Celsius;
  readonly asCastSolidusC: Celsius | null;
  /** Melt temperature at the pour: whole degrees, so that what is shown and what is judged agree. */
  readonly pourC: { readonly low: Celsius; readonly target: Celsius; readonly high: Celsius };
  /** Melt temperature to hold in the crucible before the flask is taken out. */
  readonly meltHoldC: Celsius;
  readonly flaskHoldC: Celsius;
  /** The coldest the mould may be at the pour. */
  readonly flaskPourLowC: Celsius;
  readonly roomC: Celsius;
  readonly coolingPerSecond: number;
  /** Seconds between flask out and the latest pour, for a flask at its hold temperature. */
  readonly pourWindowS: number;
  readonly metalWantedG: Grams;
  readonly quench: QuenchRule;
  readonly basis: Readonly<Record<FigureKey, Basis>>;
}

/** What a card's figures are computed from. */
export interface CardFiguresInput {
  readonly alloyName: string;
  readonly family: AlloyFamily;
  readonly alloy: AlloyFigures;
  readonly quench: QuenchRule;
  readonly method: CastingMethod;
  /** Thinnest section of the tree, mm. */
  readonly sectionMm: number;
  /** Wax mass of the complete tree, g. */
  readonly waxMassG: Grams;
  readonly flaskDiameterMm: number;
  readonly tables: ProcessTables;
  /** The cooling constant chosen for this flask size; the table's where it is left out. */
  readonly cooling?: ChosenCooling | undefined;
}

const middle = ({ low, high }: Range): number => (low + high) / 2;

/** Centrifugal pours take the lower end of a flask range, because the metal is driven in. */
const flaskTarget = (range: Range, method: CastingMethod): number =>
  Math.round(method === 'vacuum' ? middle(range) : range.low + (range.high - range.low) / 4);

/** Metal for a tree in g: wax and button by volume, at the alloy's own density. */
export const metalForWax = (waxMassG: Grams, metalDensity: number, tables: ProcessTables): Grams =>
  (waxMassG * (1 + tables.buttonShare) * metalDensity) / tables.waxDensityGPerCm3;

/** Computes every number of a pour card, each with its rule, inputs and source. */
export const computeCardFigures = (input: CardFiguresInput): CardFigures => {
  const { alloy, method, tables } = input;
  const band = bandOfSection(input.sectionMm);
  const superheat = tables.superheat[method][band];
  const flaskRange = tables.flask[input.family][band];
  const cooling = input.cooling ?? chooseCooling(input.flaskDiameterMm, tables.flaskCooling, null);
  const pourC = {
    low: Math.ceil(alloy.liquidusC + superheat.low),
    target: Math.round(alloy.liquidusC + middle(superheat)),
    high: Math.floor(alloy.liquidusC + superheat.high),
  };
  const flaskHoldC = flaskTarget(flaskRange, method);
  const flaskPourLowC = flaskHoldC - tables.flaskDropC;
  const mould = { startC: flaskHoldC, roomC: tables.roomC, perSecond: cooling.perSecond };
  const numbers = {
    liquidusC: alloy.liquidusC,
    solidusC: alloy.solidusC,
    asCastSolidusC: alloy.asCastSolidusC,
    pourC,
    meltHoldC: pourC.target + tables.transferDropC,
    flaskHoldC,
    flaskPourLowC,
    roomC: tables.roomC,
    coolingPerSecond: cooling.perSecond,
    pourWindowS: Math.floor(secondsUntil(mould, flaskPourLowC)),
    metalWantedG: metalForWax(input.waxMassG, alloy.densityGPerCm3, tables),
    quench: input.quench,
  };
  return { ...numbers, basis: explainFigures(input, numbers, { superheat, flaskRange, band, cooling }) };
};
