import { describe, expect, it } from 'vitest';
import { countFaults } from './count-faults.ts';

describe('countFaults', () => {
  it('counts fields at any depth, not the form as a whole', () => {
    const errors = {
      name: { type: 'too_small', message: 'Name the studio.', ref: { message: 'an element' } },
      limits: { lossShare: { type: 'custom', message: 'At most 20 %.' } },
      processTables: { flaskCooling: [undefined, { diameterMm: { type: 'x', message: 'At least 20 mm.' } }] },
      root: { server: { type: 'server', message: 'Someone else changed the settings.' } },
    };
    expect(countFaults(errors)).toBe(3);
    expect(countFaults({})).toBe(0);
  });
});
