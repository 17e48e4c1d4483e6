import { fromCelsius, toCelsius, type TemperatureUnit } from '#shared/lib/units.ts';
import type { ReadingVerdict } from '#shared/domain/pour-card/judge-reading.ts';

/** How far a furnace's display may be from the card before it is questioned, °C; the studio's choice, no source. */
const questionBeyondC = 100;
const coldestC = -10;

/** Judges a flask furnace's display, typed in the studio's unit, against the card's flask temperature. */
export const judgeFurnace = (
  typed: number,
  unit: TemperatureUnit,
  flaskHoldC: number,
  furnaceMaxC: number,
): ReadingVerdict => {
  const celsius = toCelsius(typed, unit);
  const card = `${Math.round(fromCelsius(flaskHoldC, unit))} °${unit}`;
  const other: TemperatureUnit = unit === 'C' ? 'F' : 'C';
  const asOther = toCelsius(typed, other);
  const meant =
    Math.abs(asOther - flaskHoldC) <= questionBeyondC
      ? { celsius: asOther, label: `${typed} °${other}` }
      : null;
  const isPossible = celsius >= coldestC && celsius <= furnaceMaxC;
  if (!isPossible || (meant && Math.abs(celsius - flaskHoldC) > questionBeyondC)) {
    const ask = meant ? ` Did you mean ${meant.label}?` : ' Read the display again.';
    return { kind: 'refuse', sentence: `${typed} °${unit} is far from the card’s ${card}.${ask}`, meant };
  }
  if (Math.abs(celsius - flaskHoldC) > questionBeyondC) {
    return {
      kind: 'question',
      celsius,
      sentence: `${typed} °${unit} is far from the card’s ${card}. Is that right?`,
    };
  }
  return { kind: 'accept', celsius };
};
