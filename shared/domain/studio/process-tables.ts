import type { AlloyFamily } from '../alloy/alloy-family.ts';
import type { CastingMethod } from '../casting/casting-method.ts';
import type { SectionBand } from '../casting/section-band.ts';

/** A range of temperature, or of temperature difference, in °C. */
export interface Range {
  readonly low: number;
  readonly high: number;
}

/** A flask diameter with the rate at which the mould cools towards the room, per second. */
export interface FlaskCooling {
  readonly diameterMm: number;
  readonly perSecond: number;
}

/** The owner's tables from which every pour card is computed. */
export interface ProcessTables {
  /** Superheat over the liquidus at the pour, °C. */
  readonly superheat: Readonly<Record<CastingMethod, Readonly<Record<SectionBand, Range>>>>;
  /** Flask temperature in the furnace, °C. */
  readonly flask: Readonly<Record<AlloyFamily, Readonly<Record<SectionBand, Range>>>>;
  readonly flaskCooling: readonly FlaskCooling[];
  /** How far the mould may cool between furnace and pour, °C. */
  readonly flaskDropC: number;
  /** What the metal loses between crucible and mould, °C. */
  readonly transferDropC: number;
  readonly roomC: number;
  readonly waxDensityGPerCm3: number;
  /** Sprue button, as a share of the wax mass added before converting to metal. */
  readonly buttonShare: number;
  readonly sources: Readonly<
    Record<'superheat' | 'flask' | 'flaskCooling' | 'flaskDrop' | 'transferDrop' | 'wax' | 'button', string>
  >;
}

const goldFlask = {
  thin: { low: 600, high: 680 },
  medium: { low: 500, high: 590 },
  heavy: { low: 427, high: 480 },
};

/** What a new studio begins with; the owner edits every figure. */
export const defaultProcessTables: ProcessTables = {
  superheat: {
    vacuum: { thin: { low: 93, high: 111 }, medium: { low: 74, high: 93 }, heavy: { low: 56, high: 74 } },
    centrifugal: { thin: { low: 55, high: 69 }, medium: { low: 42, high: 55 }, heavy: { low: 28, high: 42 } },
  },
  flask: {
    silver: {
      thin: { low: 510, high: 538 },
      medium: { low: 470, high: 510 },
      heavy: { low: 427, high: 470 },
    },
    'yellow-gold': goldFlask,
    'rose-gold': goldFlask,
    'white-gold': {
      thin: { low: 640, high: 704 },
      medium: { low: 550, high: 640 },
      heavy: { low: 480, high: 538 },
    },
  },
  flaskCooling: [
    { diameterMm: 64, perSecond: 0.00126 },
    { diameterMm: 89, perSecond: 0.00113 },
    { diameterMm: 102, perSecond: 0.00108 },
  ],
  flaskDropC: 30,
  transferDropC: 5,
  roomC: 22,
  waxDensityGPerCm3: 0.96,
  buttonShare: 0.1,
  sources: {
    superheat:
      'A trade supplier’s published casting tips: 56 to 111 °C over the liquidus with vacuum, 28 to 69 °C by centrifuge, less for less detail; divided in thirds by thinnest section.',
    flask:
      'Trade suppliers’ published ranges: 593 to 704 °C fine gold work, 427 to 538 °C plain gold and silver; divided by thinnest section after common practice.',
    flaskCooling:
      'Computed estimate for a burnt-out gypsum mould 10 mm inside its wall, no steel wall, no metal. Replace it by a trial with a thermocouple in a spare flask.',
    flaskDrop: 'Common practice, no source: outer patterns kept within about 30 °C of the set point.',
    transferDrop: 'Common practice, no source.',
    wax: 'Carving and injection wax, 0.95 to 0.98 g/cm³ by the trade press.',
    button: 'A published wax-to-metal rule: 10 % added to the wax for the button.',
  },
};
