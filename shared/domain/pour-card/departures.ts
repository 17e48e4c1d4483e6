import {
  formatClock,
  formatMass,
  formatTemperature,
  formatTemperatureDifference,
  type Celsius,
  type Grams,
} from '#shared/lib/units.ts';
import { metalName } from '../metal/metal-name.ts';
import type { QuenchRule } from '../alloy/quench-rule.ts';
import type { CardEvent, StopReason } from './card-event.ts';
import type { CardContext, Departure, Pour } from './card-state.ts';
import type { MetalVerdict } from './judge-metal.ts';

type Departures = readonly Departure[];

const none: Departures = [];

/** How far the furnace's display may be from the planned flask temperature before it is remarked on, °C. */
const flaskToleranceC = 15;

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
export const ofFurnaceReading = (
  furnaceC: Celsius | null,
  { figures: { flaskHoldC }, units }: CardContext,
  at: string,
): Departures => {
  if (furnaceC === null || Math.abs(furnaceC - flaskHoldC) <= flaskToleranceC) return none;
  const sentence = `The flask came out at ${formatTemperature(furnaceC, units.temperature)}; the card plans ${formatTemperature(flaskHoldC, units.temperature)}.`;
  return [{ kind: 'flask-off-temperature', sentence, at }];
};

/** A pour after the window, or with the melt out of its range. */
export const ofPour = (
  { meltC, secondsOut, flaskC }: Pour,
  { figures, units }: CardContext,
  at: string,
): Departures => {
  const { pourC, flaskPourLowC } = figures;
  const degrees = (celsius: number): string => formatTemperature(celsius, units.temperature);
  const late: Departures =
    flaskC < flaskPourLowC
      ? [
          {
            kind: 'poured-late',
            sentence: `Poured ${formatClock(secondsOut)} after flask out, with the mould expected at ${degrees(flaskC)}; the card allows no colder than ${degrees(flaskPourLowC)}.`,
            at,
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
          },
        ]
      : none;
  return [...late, ...off];
};

/** A quench before or after the alloy's rule. */
export const ofQuench = (waitedS: number, { earliestS, latestS }: QuenchRule, at: string): Departures => {
  if (waitedS < earliestS) {
    const sentence = `Quenched after ${formatClock(waitedS)}; this alloy waits ${formatClock(earliestS)}.`;
    return [{ kind: 'quenched-early', sentence, at }];
  }
  if (latestS !== null && waitedS > latestS) {
    const sentence = `Quenched after ${formatClock(waitedS)}; this alloy should be quenched by ${formatClock(latestS)}.`;
    return [{ kind: 'quenched-late', sentence, at }];
  }
  return none;
};

/** Loss over the studio's limit, or a fault seen in the casting. */
export const ofClosing = (
  { lossMassG, look }: Extract<CardEvent, { type: 'closed' }>,
  metalInG: Grams,
  { limits: { lossShare }, units }: CardContext,
  at: string,
): Departures => {
  const share = metalInG > 0 ? lossMassG / metalInG : 0;
  const loss: Departures =
    share > lossShare
      ? [
          {
            kind: 'loss-over-limit',
            sentence: `${formatMass(lossMassG, units.mass)} lost, ${(share * 100).toFixed(1)} % of the metal in; the studio's limit is ${(lossShare * 100).toFixed(1)} %.`,
            at,
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
        },
      ];

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
