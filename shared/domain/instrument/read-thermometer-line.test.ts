import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import {
  checkMarkOf,
  lastSequence,
  linesLost,
  readThermometerLine,
  writeThermometerLine,
} from './read-thermometer-line.ts';
import { thermocouples, thermocoupleTypes, toleranceAt } from './thermocouple.ts';

const reading = (line: string) => {
  const read = readThermometerLine(line);
  if (read.kind !== 'reading') throw new Error(`${line}: ${read.sentence}`);
  return read;
};

describe('a line of a thermometer', () => {
  it('is read with a point or a comma, in °C or °F, with white space around it', () => {
    expect(reading('T;K;892.4;C;117;ok')).toEqual({
      kind: 'reading',
      type: 'K',
      temperatureC: 892.4,
      sequence: 117,
    });
    expect(reading('  T;S;892,4;C;0;ok\r\n').temperatureC).toBe(892.4);
    expect(reading('T;N;1832;F;1;ok').temperatureC).toBe(1000);
  });

  it('is refused as damaged when its check mark does not fit', () => {
    const body = 'T;K;892.4;C;117;ok';
    expect(reading(`${body}*${checkMarkOf(body)}`).temperatureC).toBe(892.4);
    expect(readThermometerLine(`T;K;92.4;C;117;ok*${checkMarkOf(body)}`)).toMatchObject({
      kind: 'unreadable',
      sentence: expect.stringContaining('damaged') as string,
    });
  });

  it.each([
    ['T;K;;C;118;open', 'open', /open/],
    ['T;K;9999;C;118;open', 'open', /not plugged in/],
    ['T;K;;C;118;over', 'over-range', /above its range/],
    ['T;S;;C;118;under', 'under-range', /wrong way round/],
    ['T;K;;;118;fault', 'other', /fault of its own/],
    ['T;K;1372.1;C;118;ok', 'over-range', /above its range/],
    ['T;N;1301;C;118;ok', 'over-range', /above its range/],
    ['T;S;-51;C;118;ok', 'under-range', /below its range/],
  ])('%s says %s and no temperature', (line, fault, words) => {
    const read = readThermometerLine(line);
    expect(read).toMatchObject({ kind: 'fault', fault, sequence: 118 });
    expect(read).not.toHaveProperty('temperatureC');
    expect('sentence' in read && read.sentence).toMatch(words);
  });

  it.each([
    '',
    'T',
    '892.4',
    'B;K;892.4;C;117;ok',
    'T;J;892.4;C;117;ok',
    'T;K;892.4;K;117;ok',
    'T;K;892.4;C;-1;ok',
    'T;K;892.4;C;12345;ok',
    'T;K;8.9e2;C;117;ok',
    'T;K;1.892,4;C;117;ok',
    'T;K;NaN;C;117;ok',
    'T;K;;C;117;ok',
    'T;K;892.4;C;117;constructor',
    'T;K;892.4;C;117;ok;more',
    `T;K;892.4;C;117;ok${' '.repeat(10)}${'x'.repeat(200)}`,
  ])('%j is unreadable, with a reason', (line) => {
    const read = readThermometerLine(line);
    expect(read.kind).toBe('unreadable');
    expect('sentence' in read && read.sentence).toMatch(/\.$/);
  });

  it('never throws and never tells a temperature outside the thermocouple’s range, whatever comes', () => {
    const piece = fc.constantFrom('T', 'K', ';', '892.4', 'C', 'ok', 'open', '*', '\0', '٣', '-', '1e9', ' ');
    const noise = fc.oneof(
      fc.string({ unit: 'binary' }),
      fc.array(piece, { maxLength: 16 }).map((pieces) => pieces.join('')),
    );
    fc.assert(
      fc.property(noise, (line) => {
        const read = readThermometerLine(line);
        if (read.kind !== 'reading') return read.sentence.length > 0;
        const { lowestC, highestC } = thermocouples[read.type];
        return read.temperatureC >= lowestC && read.temperatureC <= highestC;
      }),
      { numRuns: 2000, seed: 20_261_201 },
    );
  });

  it('is read back as it was written', () => {
    const said = fc.record({
      type: fc.constantFrom(...thermocoupleTypes),
      tenths: fc.integer({ min: 0, max: 13_000 }),
      sequence: fc.integer({ min: 0, max: 50_000 }),
    });
    fc.assert(
      fc.property(said, ({ type, tenths, sequence }) => {
        const temperatureC = tenths / 10;
        expect(readThermometerLine(writeThermometerLine(type, { temperatureC }, sequence))).toEqual({
          kind: 'reading',
          type,
          temperatureC,
          sequence: sequence % (lastSequence + 1),
        });
      }),
    );
    for (const fault of ['open', 'over-range', 'under-range', 'other'] as const)
      expect(readThermometerLine(writeThermometerLine('S', { fault }, 3))).toMatchObject({ fault });
  });

  it('with one character changed is never taken for another temperature', () => {
    const line = writeThermometerLine('K', { temperatureC: 1092.4 }, 117);
    fc.assert(
      fc.property(
        fc.nat(line.lastIndexOf('*') - 1),
        fc.string({ unit: 'grapheme-ascii', minLength: 1, maxLength: 1 }),
        (at, put) => {
          fc.pre(line[at] !== put);
          const read = readThermometerLine(line.slice(0, at) + put + line.slice(at + 1));
          return read.kind !== 'reading';
        },
      ),
    );
  });
});

describe('lost lines', () => {
  it('are counted by the number each carries, over its turn', () => {
    expect([linesLost(4, 5), linesLost(4, 8), linesLost(9999, 0), linesLost(9998, 3)]).toEqual([0, 3, 0, 4]);
  });

  it('are none when the instrument began anew', () => {
    expect(linesLost(512, 0)).toBe(0);
  });
});

describe('a thermocouple of tolerance class 2', () => {
  it('may be off by the larger of degrees and share', () => {
    expect(toleranceAt('K', 100)).toBe(2.5);
    expect(toleranceAt('K', 900)).toBeCloseTo(6.75, 9);
    expect(toleranceAt('S', 1000)).toBeCloseTo(2.5, 9);
  });
});
