import { formatMass, formatTemperature, formatTemperatureDifference, type Units } from '#shared/lib/units.ts';

/** A figure and its unit apart, for the one large number of a step. */
export interface SplitFigure {
  readonly figure: string;
  readonly unit: string;
}

/** Writes temperatures (from °C) and masses (from g) in one studio's units. */
export interface UnitWriter {
  readonly units: Units;
  readonly temperature: (celsius: number) => string;
  readonly difference: (celsius: number) => string;
  readonly mass: (grams: number) => string;
  /** A temperature without its unit. */
  readonly degrees: (celsius: number) => string;
  /** The unit of temperature, `°C` or `°F`. */
  readonly degreeUnit: string;
}

/** Takes a written figure apart at the space before its unit. */
export const splitFigure = (written: string): SplitFigure => {
  const [figure = '', unit = ''] = written.split(/\s/);
  return { figure, unit };
};

/** The writer for a studio's units. */
export const unitWriter = (units: Units): UnitWriter => {
  const temperature = (celsius: number): string => formatTemperature(celsius, units.temperature);
  return {
    units,
    temperature,
    difference: (celsius) => formatTemperatureDifference(celsius, units.temperature),
    mass: (grams) => formatMass(grams, units.mass),
    degrees: (celsius) => splitFigure(temperature(celsius)).figure,
    degreeUnit: `°${units.temperature}`,
  };
};
