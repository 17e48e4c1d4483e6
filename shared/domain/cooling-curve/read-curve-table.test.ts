import { describe, expect, it } from 'vitest';
import { readCurveTable } from './read-curve-table.ts';

const points = (rows: readonly (readonly string[])[]) => {
  const read = readCurveTable(rows);
  if (!read.ok) throw new Error(read.error);
  return read.value.map(({ seconds, temperatureC }) => [seconds, temperatureC]);
};

const fault = (rows: readonly (readonly string[])[]): string => {
  const read = readCurveTable(rows);
  return read.ok ? '' : read.error;
};

describe('a table of time and temperature', () => {
  it('is read by its headings, in any order and with columns beside them', () => {
    expect(
      points([
        ['no', 'Temperature °C', 'Time (s)'],
        ['1', '960,5', '12'],
        ['2', '959.8', '13,5'],
      ]),
    ).toEqual([
      [0, 960.5],
      [1.5, 959.8],
    ]);
  });

  it.each<[string, string, number]>([
    ['Time (s)', '90', 0],
    ['Time, min', '1.5', 90],
    ['hours', '0.5', 1800],
    ['time', '0:01:30', 90],
    ['time', '01:30', 90],
    ['Date', '2026-12-01 10:01:30', 90],
    ['timestamp', '2026-12-01T10:01:30.500Z', 90.5],
  ])('knows a time under “%s” written %s', (heading, time, expected) => {
    const first = time.includes('-') ? time.replace(/01:30(\.500)?/, '00:00') : '0';
    const begin = heading === 'Time (s)' ? time : first;
    const rows = [
      [heading, 'temp'],
      [begin, '900'],
      [time, '899'],
    ];
    expect(points(rows)[1]).toEqual([expected, 899]);
  });

  it.each(['Temp °F', 'temperature (F)', 'Fahrenheit', 'Temp [deg F]'])('turns %s into °C', (heading) => {
    expect(
      points([
        ['t', heading],
        ['0', '1832'],
      ]),
    ).toEqual([[0, 1000]]);
  });

  it('needs no headings for two columns, seconds and °C', () => {
    expect(
      points([
        ['5', '960'],
        ['6', '959'],
      ]),
    ).toEqual([
      [0, 960],
      [1, 959],
    ]);
  });

  it.each<[string, readonly (readonly string[])[], RegExp]>([
    ['is empty', [], /empty/],
    [
      'has decimal commas read as separators',
      [['0', '0', '960', '5']],
      /decimal commas were read as separators/,
    ],
    ['has one column, by a wrong separator', [['time;temp']], /Check the separator/],
    [
      'names no temperature',
      [
        ['time', 'colour'],
        ['0', 'red'],
      ],
      /one of temperature/,
    ],
    [
      'has a row too long',
      [
        ['time', 'temp'],
        ['0', '960', '5'],
      ],
      /Line 2 has 3 cells/,
    ],
    [
      'has words for a temperature',
      [
        ['time', 'temp'],
        ['0', 'hot'],
      ],
      /Line 2: “hot” is not a temperature/,
    ],
    [
      'has words for a time',
      [
        ['time', 'temp'],
        ['soon', '900'],
      ],
      /Line 2: “soon” is not a time/,
    ],
    [
      'has a temperature of no furnace',
      [
        ['time', 'temp'],
        ['0', '9000'],
      ],
      /no temperature of a furnace/,
    ],
    ['has three bare columns', [['0', '1', '2']], /two columns, seconds and °C; this one has 3/],
  ])('is refused when it %s', (_what, rows, words) => {
    expect(fault(rows)).toMatch(words);
  });
});
