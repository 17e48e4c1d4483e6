import { castingMethodNames } from '../casting/casting-method.ts';
import { sectionBandNames, type SectionBand } from '../casting/section-band.ts';
import type { ChosenCooling } from '../instrument/choose-cooling.ts';
import type { Range } from '../studio/process-tables.ts';
import type { Basis, BasisInput } from './basis.ts';
import type { CardFigures, CardFiguresInput, FigureKey } from './card-figures.ts';

/** The rows of the studio's tables that were used. */
export interface RowsUsed {
  readonly superheat: Range;
  readonly flaskRange: Range;
  readonly band: SectionBand;
  readonly cooling: ChosenCooling;
}

type Numbers = Omit<CardFigures, 'basis'>;

const rangeInputs = (label: string, range: Range, unit: 'C' | 'dC'): readonly BasisInput[] => [
  { label: `${label}, from`, value: range.low, unit },
  { label: `${label}, to`, value: range.high, unit },
];

const explainMelting = ({ alloy, alloyName }: CardFiguresInput): Record<'liquidus' | 'solidus', Basis> => {
  const rule =
    alloy.basis === 'computed' ? 'Phase equilibrium of this composition.' : 'Measured range, not computed.';
  const inputs: readonly BasisInput[] = [{ label: 'Alloy', value: alloyName, unit: 'text' }];
  return {
    liquidus: { rule: `${rule} All liquid above it.`, inputs, source: alloy.source },
    solidus: { rule: `${rule} All solid below it, after slow cooling.`, inputs, source: alloy.source },
  };
};

const explainMelt = (
  { method, sectionMm, tables }: CardFiguresInput,
  { liquidusC, pourC }: Numbers,
  { superheat, band }: RowsUsed,
): Record<'pour' | 'meltHold', Basis> => ({
  pour: {
    rule: `Liquidus plus superheat for ${castingMethodNames[method]} casting, thinnest section ${sectionBandNames[band]}.`,
    inputs: [
      { label: 'Liquidus', value: liquidusC, unit: 'C' },
      { label: 'Thinnest section', value: sectionMm, unit: 'mm' },
      ...rangeInputs('Superheat', superheat, 'dC'),
    ],
    source: tables.sources.superheat,
  },
  meltHold: {
    rule: 'Pour temperature plus what the metal loses on its way to the mould.',
    inputs: [
      { label: 'Pour temperature', value: pourC.target, unit: 'C' },
      { label: 'Lost on the way', value: tables.transferDropC, unit: 'dC' },
    ],
    source: tables.sources.transferDrop,
  },
});

const explainFlask = (
  { method, sectionMm, tables, flaskDiameterMm }: CardFiguresInput,
  numbers: Numbers,
  { flaskRange, cooling }: RowsUsed,
): Record<'flaskHold' | 'flaskPour' | 'pourWindow', Basis> => {
  const hold: BasisInput = { label: 'Flask in the furnace', value: numbers.flaskHoldC, unit: 'C' };
  const place = method === 'vacuum' ? 'its middle for vacuum-assisted' : 'its lower end for centrifugal';
  return {
    flaskHold: {
      rule: `The studio's range for this family and section; ${place} casting.`,
      inputs: [
        { label: 'Thinnest section', value: sectionMm, unit: 'mm' },
        ...rangeInputs('Range', flaskRange, 'C'),
      ],
      source: tables.sources.flask,
    },
    flaskPour: {
      rule: 'The furnace temperature less the cooling allowed before the pour.',
      inputs: [hold, { label: 'Allowed cooling', value: tables.flaskDropC, unit: 'dC' }],
      source: tables.sources.flaskDrop,
    },
    pourWindow: {
      rule: 'Time in which the mould cools from its furnace temperature to the coldest allowed, by Newton’s law of cooling.',
      inputs: [
        hold,
        { label: 'Coldest allowed', value: numbers.flaskPourLowC, unit: 'C' },
        { label: 'Room', value: numbers.roomC, unit: 'C' },
        { label: 'Flask diameter', value: flaskDiameterMm, unit: 'mm' },
        { label: 'Cooling rate', value: numbers.coolingPerSecond, unit: 'perSecond' },
        { label: 'Readings behind the rate', value: String(cooling.readings), unit: 'text' },
      ],
      source: cooling.from === 'fitted' ? cooling.words : `${cooling.words} ${tables.sources.flaskCooling}`,
    },
  };
};

const explainMetal = ({ waxMassG, alloy, tables }: CardFiguresInput): Basis => ({
  rule: 'Wax mass plus button, times the density of the metal over that of the wax.',
  inputs: [
    { label: 'Wax', value: waxMassG, unit: 'g' },
    { label: 'Button', value: tables.buttonShare, unit: 'share' },
    { label: 'Density of the metal', value: alloy.densityGPerCm3, unit: 'gPerCm3' },
    { label: 'Density of the wax', value: tables.waxDensityGPerCm3, unit: 'gPerCm3' },
  ],
  source: `${tables.sources.button} ${tables.sources.wax}`,
});

const explainQuench = ({ quench }: CardFiguresInput): Basis => ({
  rule: quench.why,
  inputs: [
    { label: 'Not before', value: quench.earliestS, unit: 's' },
    ...(quench.latestS === null ? [] : [{ label: 'Not after', value: quench.latestS, unit: 's' } as const]),
  ],
  source: quench.source,
});

/** The rule, inputs and source behind each figure of a pour card. */
export const explainFigures = (
  input: CardFiguresInput,
  numbers: Numbers,
  rows: RowsUsed,
): Readonly<Record<FigureKey, Basis>> => ({
  ...explainMelting(input),
  ...explainMelt(input, numbers, rows),
  ...explainFlask(input, numbers, rows),
  metalWanted: explainMetal(input),
  quench: explainQuench(input),
});
