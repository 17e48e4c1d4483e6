import { coolingRateFor } from '../pour-card/flask-cooling.ts';
import type { FlaskCooling } from '../studio/process-tables.ts';
import { faultOfFit, type CoolingFit } from './fit-flask-cooling.ts';

/** The cooling constant a card uses for a flask size, and what stands behind it in words. */
export interface ChosenCooling {
  readonly perSecond: number;
  readonly from: 'default' | 'fitted';
  /** Readings that stand behind it; 0 for a default. */
  readonly readings: number;
  /** Which is used, and how many readings stand behind it. */
  readonly words: string;
}

const perMinute = (perSecond: number): string => (60 * perSecond).toFixed(4);

/** The constant for a flask diameter: fitted to the studio's own readings of that size where they suffice, else its table's. */
export const chooseCooling = (
  diameterMm: number,
  table: readonly FlaskCooling[],
  fit: CoolingFit | null,
): ChosenCooling => {
  const fault = faultOfFit(fit);
  if (fit && fault === null)
    return {
      perSecond: fit.perSecond,
      from: 'fitted',
      readings: fit.readings,
      words: `Fitted to ${fit.readings} readings of ${fit.outings} flasks of this size: ${perMinute(fit.perSecond)} ± ${perMinute(fit.standardError ?? 0)} per minute (standard error).`,
    };
  const { perSecond, diameterMm: nearestMm } = coolingRateFor(diameterMm, table);
  return {
    perSecond,
    from: 'default',
    readings: 0,
    words: `The table’s default for ${nearestMm} mm; no reading stands behind it. ${fault ?? ''}`.trim(),
  };
};
