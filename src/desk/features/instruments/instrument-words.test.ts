import { describe, expect, it } from 'vitest';
import { offsetWords, readingWords } from './instrument-words.ts';

const reading = { rawC: 892.4, offsetC: 4.3, temperatureC: 896.7, fault: null, takenAt: '', ageS: 0 };

describe('a reading in words', () => {
  it('shows what was read beside what it means', () => {
    expect(readingWords(reading, 'C')).toBe('896.7\u00a0°C (read 892.4, offset +4.3\u00a0°C)');
    expect(readingWords({ ...reading, offsetC: 0, temperatureC: 892.4 }, 'C')).toBe(
      '892.4\u00a0°C, no offset',
    );
  });

  it('is in the studio’s unit, differences too', () => {
    expect(readingWords(reading, 'F')).toBe('1646.1\u00a0°F (read 1638.3, offset +7.7\u00a0°F)');
    expect(offsetWords(-5, 'F')).toBe('−9.0\u00a0°F');
  });

  it('is the fault where there is no temperature', () => {
    expect(readingWords({ ...reading, rawC: null, temperatureC: null, fault: 'open' }, 'C')).toBe(
      'open thermocouple',
    );
  });
});
