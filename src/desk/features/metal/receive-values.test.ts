import { describe, expect, it } from 'vitest';
import { receiveLotRequest } from '#shared/contracts/lot.ts';
import { studioClock } from '#src/desk/parts/studio-clock.ts';
import { formSchema } from '#src/desk/parts/form-schema.ts';
import { emptyReceive, receiveReading } from './receive-values.ts';

const now = Date.parse('2026-12-01T09:30:00Z');
const key = '0b0f3c1e-6a52-4f0c-9d3a-0c6a4d0e7f11';
const schema = formSchema(
  receiveLotRequest,
  receiveReading({ key, unit: 'ozt', clock: studioClock('Europe/Lisbon'), nowMs: now }),
);

const typed = {
  ...emptyReceive('2026-12-01'),
  name: 'Sterling grain',
  kind: 'grain' as const,
  parts: [
    { symbol: 'ag', wt: '92,5', tolerance: '0,1' },
    { symbol: 'Cu', wt: '7,5', tolerance: '' },
    { symbol: '', wt: '', tolerance: '' },
  ],
  mass: '10',
};

const faultsOf = (values: typeof typed) =>
  schema.safeParse(values).error?.issues.map(({ path }) => path.join('.')) ?? [];

describe('the form of a lot that is received', () => {
  it('becomes a request in grams with decimal commas read', () => {
    expect(schema.parse(typed)).toMatchObject({
      key,
      kind: 'grain',
      alloyRevisionId: null,
      compositionWt: { Ag: 92.5, Cu: 7.5 },
      toleranceWt: { Ag: 0.1 },
      massG: 311.035,
      receivedAt: '2026-12-01T09:30:00.000Z',
      confirmed: false,
    });
  });

  it('takes noon of the studio for a day gone by', () => {
    expect(schema.parse({ ...typed, receivedOn: '2026-11-28' }).receivedAt).toBe('2026-11-28T12:00:00.000Z');
  });

  it('puts every fault at its own field', () => {
    expect(faultsOf({ ...typed, name: ' ' })).toEqual(['name']);
    expect(faultsOf({ ...typed, mass: 'ten' })).toEqual(['mass']);
    expect(faultsOf({ ...typed, mass: '-1' })).toEqual(['mass']);
    expect(faultsOf({ ...typed, receivedOn: '' })).toEqual(['receivedOn']);
    const [silver, copper] = typed.parts;
    if (!silver || !copper) throw new Error('The typed lot has two parts.');
    expect(faultsOf({ ...typed, parts: [silver, { ...copper, symbol: 'AG' }] })).toEqual(['parts.1.symbol']);
    expect(faultsOf({ ...typed, parts: [silver, { ...copper, wt: '7..5' }] })).toEqual(['parts.1.wt']);
    expect(faultsOf({ ...typed, parts: [{ ...silver, tolerance: '9' }, copper] })).toEqual([
      'parts.0.tolerance',
    ]);
  });
});
