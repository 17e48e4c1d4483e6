declare const celsius: unique symbol;
declare const grams: unique symbol;
/** A temperature in degrees Celsius, the canonical unit of every record. */
export type Celsius = number & { readonly [celsius]?: true };
/** A mass in grams, the canonical unit of every record. */
export type Grams = number & { readonly [grams]?: true };

/** The temperature scale a studio reads. */
export type TemperatureUnit = 'C' | 'F';
/** The unit of mass a studio weighs in: gram, pennyweight or troy ounce. */
export type MassUnit = 'g' | 'dwt' | 'ozt';

/** Units in which a mass may be typed wherever the studio's own is not the one at hand. */
export const typedMassUnits = ['g', 'kg', 'dwt', 'ozt'] as const;
/** One of them. */
export type TypedMassUnit = (typeof typedMassUnits)[number];

/** The units a studio reads and weighs in. */
export interface Units {
  readonly temperature: TemperatureUnit;
  readonly mass: MassUnit;
}

/** Grams in one unit of mass; exact: 1 ozt = 31.1034768 g (international pound, 1959), 1 dwt = ozt / 20. */
const gramsPer: Readonly<Record<TypedMassUnit, number>> = {
  g: 1,
  kg: 1000,
  dwt: 31.1034768 / 20,
  ozt: 31.1034768,
};

/** Converts a temperature as typed in `unit` to °C. */
export const toCelsius = (value: number, unit: TemperatureUnit): Celsius =>
  unit === 'C' ? value : ((value - 32) * 5) / 9;

/** Converts °C to the studio's `unit`. */
export const fromCelsius = (value: Celsius, unit: TemperatureUnit): number =>
  unit === 'C' ? value : (value * 9) / 5 + 32;

/** Converts a temperature difference in °C (a superheat, say) to the studio's `unit`. */
export const fromCelsiusDifference = (value: number, unit: TemperatureUnit): number =>
  unit === 'C' ? value : (value * 9) / 5;

/** Converts a mass as typed in `unit` to grams. */
export const toGrams = (value: number, unit: TypedMassUnit): Grams => value * gramsPer[unit];

/** Converts grams to the studio's `unit`. */
export const fromGrams = (value: Grams, unit: TypedMassUnit): number => value / gramsPer[unit];

const decimals: Readonly<Record<MassUnit, number>> = { g: 2, dwt: 2, ozt: 4 };

/** Writes a temperature in the studio's unit, whole degrees: `892 °C`. */
export const formatTemperature = (value: Celsius, unit: TemperatureUnit): string =>
  `${Math.round(fromCelsius(value, unit))} °${unit}`;

/** Writes a temperature difference in the studio's unit, whole degrees: `94 °C`. */
export const formatTemperatureDifference = (value: number, unit: TemperatureUnit): string =>
  `${Math.round(fromCelsiusDifference(value, unit))} °${unit}`;

/** Writes a mass in the studio's unit: `84.20 g`. */
export const formatMass = (value: Grams, unit: MassUnit): string =>
  `${fromGrams(value, unit).toFixed(decimals[unit])} ${unit}`;

/** Writes a fraction of mass as whole per cent, never `0 %` or `100 %` while some of the other phase remains. */
export const formatPercent = (fraction: number): string => {
  if (fraction <= 0) return '0 %';
  if (fraction >= 1) return '100 %';
  return `${Math.min(99, Math.max(1, Math.round(fraction * 100)))} %`;
};

/** Writes a span of seconds as a clock: `0:41`, `12:05`, `1:02:00`. */
export const formatClock = (seconds: number): string => {
  const whole = Math.max(0, Math.floor(seconds));
  const two = (value: number): string => String(value).padStart(2, '0');
  const hours = Math.floor(whole / 3600);
  const minutes = Math.floor((whole % 3600) / 60);
  return hours > 0 ? `${hours}:${two(minutes)}:${two(whole % 60)}` : `${minutes}:${two(whole % 60)}`;
};
