import { describe, expect, it } from 'vitest';
import type { IntakePreview, IntakeRow } from '#shared/contracts/lot-intake.ts';
import { chooseRows, previewSentence, resultSentence, sheetOf } from './intake-words.ts';

const row = (line: number, faults = 0, questions = 0): IntakeRow => ({
  line,
  cells: [`lot ${line}`, '12,5'],
  name: `lot ${line}`,
  kind: 'grain',
  massG: 12.5,
  compositionWt: { Ag: 100 },
  faults: Array.from({ length: faults }, () => ({ column: 1, message: 'Wrong.' })),
  questions: Array.from({ length: questions }, () => ({ column: null, message: 'Odd?' })),
});

const preview = (good: number, questioned: number, faulty: number): IntakePreview => ({
  fault: '',
  columns: [],
  rows: [],
  good,
  questioned,
  faulty,
});

describe('a sheet in words', () => {
  it('counts what is good, odd and wrong', () => {
    expect(previewSentence(preview(1, 0, 0))).toBe('1 row, all of them good.');
    expect(previewSentence(preview(985, 5, 10))).toBe(
      '1000 rows: 985 good, 5 to be looked at again, 10 with a fault.',
    );
  });

  it('says what came in and what stayed out', () => {
    expect(resultSentence({ codes: ['L-0023-1'], left: 0 })).toBe('1 lot is taken in: L-0023-1.');
    expect(resultSentence({ codes: ['L-0023-1', 'L-0024-9'], left: 1 })).toBe(
      '2 lots are taken in: L-0023-1 to L-0024-9. 1 row stayed out.',
    );
  });

  it('chooses rows by what they are', () => {
    const rows = [row(2), row(3, 1), row(4, 0, 1), row(5, 1, 1)];
    expect(chooseRows(rows, 'faulty').map(({ line }) => line)).toEqual([3, 5]);
    expect(chooseRows(rows, 'questioned').map(({ line }) => line)).toEqual([4]);
    expect(chooseRows(rows, 'all')).toHaveLength(4);
  });

  it('writes rows as a sheet again, quoting what would be read as two cells', () => {
    expect(sheetOf(['name', 'mass'], [{ cells: ['a;b "c"', '12,5'] }])).toBe('name;mass\r\n"a;b ""c""";12,5');
  });
});
