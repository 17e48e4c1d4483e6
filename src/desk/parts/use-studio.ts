import { useMemo } from 'react';
import { formatMass, formatTemperature, fromCelsius, type Units } from '#shared/lib/units.ts';
import { useDeskSession } from './desk-session.ts';
import { studioClock, type StudioClock } from './studio-clock.ts';

/** How this studio writes times, temperatures and masses. */
export interface StudioWriting {
  readonly clock: StudioClock;
  readonly units: Units;
  /** °C to words in the studio's unit: `892 °C`. */
  readonly temperature: (celsius: number) => string;
  /** °C to a bare figure in the studio's unit: `892`. */
  readonly degrees: (celsius: number) => string;
  /** Grams to words in the studio's unit: `84.20 g`. */
  readonly mass: (grams: number) => string;
}

// A figure and its unit stay on one line.
const unbroken = (text: string): string => text.replaceAll(' ', '\u00a0');

/** The studio's clock and units for the page. */
export const useStudio = (): StudioWriting => {
  const { studio } = useDeskSession();
  const { timeZone } = studio;
  const { temperature, mass } = studio.units;
  return useMemo(
    () => ({
      clock: studioClock(timeZone),
      units: { temperature, mass },
      temperature: (celsius) => unbroken(formatTemperature(celsius, temperature)),
      degrees: (celsius) => String(Math.round(fromCelsius(celsius, temperature))),
      mass: (grams) => unbroken(formatMass(grams, mass)),
    }),
    [timeZone, temperature, mass],
  );
};
