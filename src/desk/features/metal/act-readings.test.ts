import { describe, expect, it } from 'vitest';
import { correctMovementRequest } from '#shared/contracts/ledger.ts';
import { amendLotRequest, countLotRequest } from '#shared/contracts/lot.ts';
import { assayReading, emptyMass, massReading } from './act-readings.ts';
import { formSchema } from '#src/desk/parts/form-schema.ts';

const key = '0b0f3c1e-6a52-4f0c-9d3a-0c6a4d0e7f11';
const count = formSchema(
  countLotRequest,
  massReading(key, 'g', { mass: 'countedG', reason: 'explanation', sign: 'may' }),
);
const correct = formSchema(
  correctMovementRequest,
  massReading(key, 'g', { mass: 'rightMassG', reason: 'reason', sign: 'must' }),
);
const places = (result: { error?: { issues: { path: PropertyKey[] }[] } }) =>
  result.error?.issues.map(({ path }) => path.join('.'));

describe('an act on a mass', () => {
  it('may be counted without a second person', () => {
    expect(count.parse({ ...emptyMass, mass: '12,345' })).toEqual({
      key,
      countedG: 12.345,
      explanation: '',
      countersign: null,
    });
  });

  it('is corrected only with one', () => {
    const typed = { ...emptyMass, mass: '0', reason: 'wrong lot' };
    expect(places(correct.safeParse(typed))).toEqual(['sign.login', 'sign.password']);
    const sign = { login: 'ines', password: 'crucible' };
    expect(correct.parse({ ...typed, sign })).toEqual({
      key,
      rightMassG: 0,
      reason: 'wrong lot',
      countersign: sign,
    });
  });

  it('names the field of a mass that cannot be read', () => {
    expect(places(count.safeParse({ ...emptyMass, mass: 'a lot' }))).toEqual(['mass']);
  });
});

describe('a new assay', () => {
  it('is read with decimal commas, faults in their rows', () => {
    const schema = formSchema(amendLotRequest, assayReading);
    const parts = [
      { symbol: 'Au', wt: '75,1', tolerance: '0,1' },
      { symbol: 'Cu', wt: '24,9', tolerance: '' },
    ];
    expect(schema.parse({ parts, reason: 'assay 14' })).toEqual({
      kind: 'assay',
      compositionWt: { Au: 75.1, Cu: 24.9 },
      toleranceWt: { Au: 0.1 },
      reason: 'assay 14',
    });
    expect(places(schema.safeParse({ parts, reason: '' }))).toEqual(['reason']);
  });
});
