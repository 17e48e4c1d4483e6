import { parseDecimal } from '#shared/lib/decimal.ts';
import { refuse, ok, type Result } from '#shared/lib/result.ts';
import { toCelsius, type TemperatureUnit } from '#shared/lib/units.ts';
import type { CurvePoint } from './curve-point.ts';

/** The most points a curve may hold: four hours at one a second. */
export const mostPoints = 14_400;

/** How a time is written in a table. */
type TimeUnit = 's' | 'min' | 'h';

interface Columns {
  readonly time: number;
  readonly temperature: number;
  readonly timeUnit: TimeUnit;
  readonly temperatureUnit: TemperatureUnit;
}

const secondsIn: Readonly<Record<TimeUnit, number>> = { s: 1, min: 60, h: 3600 };

const timeName = /^(?:time|t|seconds?|secs?|minutes?|mins?|hours?|s|min|h|date|datetime|timestamp)\b/i;
const temperatureName = /^(?:temp(?:erature)?|reading|celsius|fahrenheit|deg(?:rees)?|°?\s*[CF]$)/i;

/** The unit of time a heading names; seconds where it names none. */
const timeUnitOf = (heading: string): TimeUnit => {
  if (/\b(?:min|mins|minutes?)\b/i.test(heading)) return 'min';
  return /\b(?:h|hours?)\b/i.test(heading) ? 'h' : 's';
};

const temperatureUnitOf = (heading: string): TemperatureUnit =>
  /fahrenheit|°\s*F|\bF\b|deg\s*F/i.test(heading) ? 'F' : 'C';

const looksNumeric = (text: string): boolean => parseDecimal(text).ok || /^\d+:\d/.test(text);

const columnsOf = (cells: readonly string[]): Result<Columns | null> => {
  if (cells.every((cell) => looksNumeric(cell.trim()))) {
    if (cells.length === 2) return ok(null);
    return refuse(
      cells.length === 4
        ? 'Each row has four cells: decimal commas were read as separators. Save the table with semicolons or tabs.'
        : `A table without headings has two columns, seconds and °C; this one has ${cells.length}.`,
    );
  }
  const headings = cells.map((cell) => cell.trim());
  const time = headings.findIndex((heading) => timeName.test(heading));
  const temperature = headings.findIndex((heading, k) => k !== time && temperatureName.test(heading));
  if (time < 0 || temperature < 0)
    return refuse(
      `The first line must name a column of time and one of temperature; it reads “${headings.join(' | ').slice(0, 80)}”. Check the separator too.`,
    );
  return ok({
    time,
    temperature,
    timeUnit: timeUnitOf(headings[time] ?? ''),
    temperatureUnit: temperatureUnitOf(headings[temperature] ?? ''),
  });
};

const clock = /^(\d+):([0-5]?\d)(?::([0-5]?\d(?:[.,]\d+)?))?$/;

/** Seconds from `90`, `1:30`, `0:01:30` or a moment such as `2026-12-01T10:00:00`; null where it is none of these. */
const readTime = (text: string, unit: TimeUnit): number | null => {
  const plain = parseDecimal(text);
  if (plain.ok) return plain.value * secondsIn[unit];
  const [, first = '', second = '', third] = clock.exec(text) ?? [];
  if (first !== '')
    return third === undefined
      ? 60 * Number(first) + Number(second)
      : 3600 * Number(first) + 60 * Number(second) + Number(third.replace(',', '.'));
  const moment = /^\d{4}-\d\d-\d\d[T ]\d\d:\d\d/.test(text) ? Date.parse(text.replace(' ', 'T')) : Number.NaN;
  return Number.isNaN(moment) ? null : moment / 1000;
};

const readRow = (cells: readonly string[], columns: Columns, line: number): Result<CurvePoint> => {
  const time = (cells[columns.time] ?? '').trim();
  const text = (cells[columns.temperature] ?? '').trim();
  const seconds = readTime(time, columns.timeUnit);
  if (seconds === null) return refuse(`Line ${line}: “${time.slice(0, 30)}” is not a time.`);
  const value = parseDecimal(text);
  if (!value.ok) return refuse(`Line ${line}: “${text.slice(0, 30)}” is not a temperature.`);
  const temperatureC = toCelsius(value.value, columns.temperatureUnit);
  if (temperatureC < -50 || temperatureC > 2000)
    return refuse(`Line ${line}: ${text} °${columns.temperatureUnit} is no temperature of a furnace.`);
  return ok({ seconds, temperatureC });
};

/** A thousandth of a second is more than any logger knows. */
const rounded = (value: number): number => Math.round(value * 1000) / 1000;

/**
 * Reads a logger's table of time and temperature: headings name the columns and their units (s, min or h; °C or °F), or
 * two bare columns are seconds and °C; decimal points or commas. Times count from the first row. A sentence when it cannot
 * be read, with the line.
 */
export const readCurveTable = (rows: readonly (readonly string[])[]): Result<readonly CurvePoint[]> => {
  const [first] = rows;
  if (!first) return refuse('The table is empty.');
  const columns = columnsOf(first);
  if (!columns.ok) return columns;
  const skipped = columns.value ? 1 : 0;
  const layout = columns.value ?? { time: 0, temperature: 1, timeUnit: 's', temperatureUnit: 'C' };
  const body = rows.slice(skipped);
  if (body.length > mostPoints) return refuse(`The table has more than ${mostPoints} rows: thin it out.`);
  const points: CurvePoint[] = [];
  for (const [k, cells] of body.entries()) {
    if (cells.length !== first.length)
      return refuse(
        `Line ${k + 1 + skipped} has ${cells.length} cells, the first line ${first.length}: a decimal comma may have been read as a separator.`,
      );
    const point = readRow(cells, layout, k + 1 + skipped);
    if (!point.ok) return point;
    points.push(point.value);
  }
  const beginsS = points[0]?.seconds ?? 0;
  return ok(
    points.map(({ seconds, temperatureC }) => ({
      seconds: rounded(seconds - beginsS),
      temperatureC: rounded(temperatureC),
    })),
  );
};
