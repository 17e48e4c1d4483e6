import { describe, expect, it } from 'vitest';
import { changePotRequest, type FilledCrucible } from '#shared/contracts/charge.ts';
import { formSchema } from '#src/desk/parts/form-schema.ts';
import { emptyPot, fillPot, potReading } from './pot-values.ts';

const crucible: FilledCrucible = {
  melt: { id: 'm1', code: 'M-0006-3' },
  alloy: { name: 'Sterling', revisionId: 'r1' },
  massG: 31.1034768,
  compositionWt: { Cu: 7.35, Ag: 92.65 },
  toleranceWt: { Ag: 0.0801 },
  person: 'Someone',
  endedAt: null,
};

describe('a pot', () => {
  it('is filled in from a crucible, the largest part first, nothing rounded away', () => {
    expect(fillPot('melt:m1', { alloys: [], crucibles: [crucible] }, 'ozt')).toEqual({
      mass: '0.99998',
      parts: [
        { symbol: 'Ag', wt: '92.65', tolerance: '0.0801' },
        { symbol: 'Cu', wt: '7.35', tolerance: '' },
      ],
    });
    expect(fillPot('melt:m2', { alloys: [], crucibles: [crucible] }, 'ozt')).toBeNull();
  });

  it('wants a mass, parts and an alloy, each at its field', () => {
    const issues = formSchema(changePotRequest, potReading('g')).safeParse(emptyPot).error?.issues ?? [];
    expect(issues.map(({ path }) => path.join('.'))).toEqual(['mass', 'alloyRevisionId', 'parts.root']);
  });
});
