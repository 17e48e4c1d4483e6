import { fromCelsius, toCelsius, type Celsius, type TemperatureUnit } from '#shared/lib/units.ts';
import type { StudioLimits } from '../studio/studio-limits.ts';
import type { CardFigures } from './card-figures.ts';

/** What the terminal makes of a typed temperature before it is stored. */
export type ReadingVerdict =
  | { readonly kind: 'accept'; readonly celsius: Celsius }
  /** Possible, but doubtful: stored only after a person has said that it is right. */
  | { readonly kind: 'question'; readonly celsius: Celsius; readonly sentence: string }
  /** Not possible as typed; `meant` is what it would be in the other unit or with a slipped digit, if that fits. */
  | {
      readonly kind: 'refuse';
      readonly sentence: string;
      readonly meant: { readonly celsius: Celsius; readonly label: string } | null;
    };

type Limits = Pick<StudioLimits, 'furnaceMaxC' | 'questionAboveC'>;
type Window = Pick<CardFigures, 'pourC'>;

const coldestPlausibleC = -10;

const fits = (celsius: Celsius, limits: Limits): boolean =>
  celsius >= coldestPlausibleC && celsius <= limits.furnaceMaxC;

/** What a person may have meant by an impossible number, only where it lands near this card's work. */
const guessMeaning = (typed: number, unit: TemperatureUnit, limits: Limits, { pourC }: Window) => {
  const other: TemperatureUnit = unit === 'C' ? 'F' : 'C';
  const nearWork = (celsius: Celsius): boolean =>
    fits(celsius, limits) && celsius > pourC.low - 500 && celsius < pourC.high + limits.questionAboveC;
  const asOther = toCelsius(typed, other);
  if (nearWork(asOther)) return { celsius: asOther, label: `${typed} °${other}` };
  const shifted = toCelsius(typed / 10, unit);
  if (nearWork(shifted)) return { celsius: shifted, label: `${typed / 10} °${unit}` };
  return null;
};

/** Judges a temperature typed in the studio's unit against the furnace, the other unit and this card's pour window. */
export const judgeReading = (
  typed: number,
  unit: TemperatureUnit,
  figures: Window,
  limits: Limits,
): ReadingVerdict => {
  const celsius = toCelsius(typed, unit);
  if (!fits(celsius, limits)) {
    const reach = Math.round(fromCelsius(limits.furnaceMaxC, unit));
    const meant = guessMeaning(typed, unit, limits, figures);
    const question = meant ? ` Did you mean ${meant.label}?` : ' Read the pyrometer again.';
    const sentence =
      celsius < coldestPlausibleC
        ? `${typed} °${unit} is colder than any workshop.${question}`
        : `${typed} °${unit} is hotter than the furnace goes (${reach} °${unit}).${question}`;
    return { kind: 'refuse', sentence, meant };
  }
  if (celsius > figures.pourC.high + limits.questionAboveC) {
    const over = Math.round(fromCelsius(celsius, unit) - fromCelsius(figures.pourC.high, unit));
    return {
      kind: 'question',
      celsius,
      sentence: `${typed} °${unit} is ${over} °${unit} over the pour window. Is that right?`,
    };
  }
  return { kind: 'accept', celsius };
};
