import {
  formatClock,
  formatMass,
  formatTemperature,
  formatTemperatureDifference,
  type Celsius,
  type Grams,
} from '#shared/lib/units.ts';
import { metalName } from '../metal/metal-name.ts';
import type { CardEvent, StopReason } from './card-event.ts';
import type { CardContext, Pour } from './card-state.ts';
import type { ChargeVerdict } from './judge-charge.ts';
import type { MetalVerdict } from './judge-metal.ts';
import type { Departure } from './variance.ts';

type Departures = readonly Departure[];

const none: Departures = [];

/** How far the furnace's display may be from the planned flask temperature before it is remarked on, °C. */
const flaskToleranceC = 15;

/** Marks what is so many times over its limit that a second person has to sign. */
const graded = (overLimit: number, { rules }: Pick<CardContext, 'rules'>): Pick<Departure, 'isMajor'> =>
  rules && overLimit > rules.countersignFactor ? { isMajor: true } : {};

/** A reading that a person stood by although it was questioned. */
export const ofConfirmedReading = (
  readingC: Celsius,
  { figures, units }: CardContext,
  at: string,
): Departures => [
  {
    kind: 'reading-confirmed',
    sentence: `A reading of ${formatTemperature(readingC, units.temperature)}, ${formatTemperatureDifference(readingC - figures.pourC.high, units.temperature)} over the pour window, was confirmed.`,
    at,
  },
];

/** A flask that left the furnace hotter or colder than planned. */
export const ofFurnaceReading = (furnaceC: Celsius | null, context: CardContext, at: string): Departures => {
  const { figures, units } = context;
  const { flaskHoldC } = figures;
  if (furnaceC === null) return none;
  const over = Math.abs(furnaceC - flaskHoldC) / flaskToleranceC;
  if (over <= 1) return none;
  const sentence = `The flask came out at ${formatTemperature(furnaceC, units.temperature)}; the card plans ${formatTemperature(flaskHoldC, units.temperature)}.`;
  return [{ kind: 'flask-off-temperature', sentence, at, ...graded(over, context) }];
};

/** A pour after the window, or with the melt out of its range. */
export const ofPour = ({ meltC, secondsOut, flaskC }: Pour, context: CardContext, at: string): Departures => {
  const { figures, units } = context;
  const { pourC, flaskPourLowC, pourWindowS } = figures;
  const middleC = (pourC.low + pourC.high) / 2;
  const degrees = (celsius: number): string => formatTemperature(celsius, units.temperature);
  const late: Departures =
    flaskC < flaskPourLowC
      ? [
          {
            kind: 'poured-late',
            sentence: `Poured ${formatClock(secondsOut)} after flask out, with the mould expected at ${degrees(flaskC)}; the card allows no colder than ${degrees(flaskPourLowC)}.`,
            at,
            ...graded(secondsOut / pourWindowS, context),
          },
        ]
      : none;
  const off: Departures =
    meltC !== null && (meltC < pourC.low || meltC > pourC.high)
      ? [
          {
            kind: 'melt-off-window',
            sentence: `Poured after a melt reading of ${degrees(meltC)}; the window is ${degrees(pourC.low)} to ${degrees(pourC.high)}.`,
            at,
            ...graded((2 * Math.abs(meltC - middleC)) / (pourC.high - pourC.low), context),
          },
        ]
      : none;
  return [...late, ...off];
};

/** A quench before or after the alloy's rule. */
export const ofQuench = (waitedS: number, context: CardContext, at: string): Departures => {
  const { earliestS, latestS } = context.figures.quench;
  if (waitedS < earliestS) {
    const sentence = `Quenched after ${formatClock(waitedS)}; this alloy waits ${formatClock(earliestS)}.`;
    return [{ kind: 'quenched-early', sentence, at, ...graded(earliestS / waitedS, context) }];
  }
  if (latestS !== null && waitedS > latestS) {
    const sentence = `Quenched after ${formatClock(waitedS)}; this alloy should be quenched by ${formatClock(latestS)}.`;
    return [{ kind: 'quenched-late', sentence, at, ...graded(waitedS / latestS, context) }];
  }
  return none;
};

/** Loss over the studio's limit, or a fault seen in the casting. */
export const ofClosing = (
  { lossMassG, look }: Extract<CardEvent, { type: 'closed' }>,
  metalInG: Grams,
  context: CardContext,
  at: string,
): Departures => {
  const { limits, units } = context;
  const { lossShare } = limits;
  const share = metalInG > 0 ? lossMassG / metalInG : 0;
  const loss: Departures =
    share > lossShare
      ? [
          {
            kind: 'loss-over-limit',
            sentence: `${formatMass(lossMassG, units.mass)} lost, ${(share * 100).toFixed(1)} % of the metal in; the studio's limit is ${(lossShare * 100).toFixed(1)} %.`,
            at,
            ...graded(share / lossShare, context),
          },
        ]
      : none;
  const fault: Departures =
    look === 'misrun' || look === 'porous' || look === 'cracked'
      ? [{ kind: 'cast-fault', sentence: `The casting looks ${look}.`, at }]
      : none;
  return [...loss, ...fault];
};

/** A charge whose parts, by its lots' certificates, are outside what the alloy allows. */
export const ofComposition = ({ offWt }: MetalVerdict, at: string): Departures =>
  offWt.length === 0
    ? none
    : [
        {
          kind: 'composition-off',
          sentence: `By the lots' certificates the charge holds ${offWt
            .map(
              ({ element, wt }) =>
                `${Math.abs(wt).toFixed(2)} wt% too ${wt > 0 ? 'much' : 'little'} ${metalName(element)}`,
            )
            .join(' and ')}.`,
          at,
          isMajor: true,
        },
      ];

/** A charge that a caster went on with although it is not the mass that the card plans. */
export const ofCharge = (
  { totalG, lowG, highG }: ChargeVerdict,
  context: CardContext,
  at: string,
): Departures => {
  const { plannedMetalG, units } = context;
  const mass = (grams: Grams): string => formatMass(grams, units.mass);
  const sentence = `The charge is ${mass(totalG)}; the card wants between ${mass(lowG)} and ${mass(highG)}.`;
  const over = Math.abs(totalG - plannedMetalG) / (highG - plannedMetalG);
  return [{ kind: 'charge-off-plan', sentence, at, ...graded(over, context) }];
};

const stopWords: Readonly<Record<StopReason, string>> = {
  spill: 'a spill',
  burn: 'a burn',
  equipment: 'equipment',
  other: 'another reason',
};

/** Work stopped on a hot step. */
export const ofStop = (reason: StopReason, at: string): Departures => [
  { kind: 'work-stopped', sentence: `Work was stopped because of ${stopWords[reason]}.`, at },
];
