import { parse } from 'csv-parse/sync';
import { describe, expect, it } from 'vitest';
import { writeCsv } from './write-csv.ts';

describe('a CSV file', () => {
  it('is read back as it was written, by another program', () => {
    const rows = [
      ['lot', 'note'],
      ['L-0001', 'safe, "top" shelf\nleft'],
      ['L-0002', ''],
    ];
    expect(parse(writeCsv(rows), { bom: true })).toEqual(rows);
  });

  it('runs no formula, and leaves numbers below nought alone', () => {
    expect(writeCsv([['=1+1', '@x', -5]])).toBe("\uFEFF'=1+1,'@x,-5\r\n");
  });
});
