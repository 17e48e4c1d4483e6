import { describe, expect, it } from 'vitest';
import { createAlloyRequest } from '#shared/contracts/alloy.ts';
import { wholeOfLot } from '#shared/domain/metal/judge-lot.ts';
import { alloyFormSchema } from './alloy-form-schema.ts';
import { emptyAlloyForm, type AlloyFormValues } from '#src/desk/parts/alloy-form-values.ts';
import { sumOfParts, sumSentence } from '#src/desk/parts/composition-fields.tsx';
import { formPathOf } from '#src/desk/parts/read-alloy-form.ts';

const sterling: AlloyFormValues = {
  ...emptyAlloyForm,
  name: 'Sterling, new',
  family: 'silver',
  parts: [
    { symbol: 'ag', wt: '92,5', tolerance: '0,3' },
    { symbol: 'Cu', wt: '7.5', tolerance: '' },
  ],
  fineness: '925',
  quench: {
    earliest: '12,5',
    latest: '',
    medium: 'water',
    why: 'It sets through.',
    source: 'A trial of our own.',
  },
};

const read = (values: AlloyFormValues, unit: 'C' | 'F' = 'C') =>
  alloyFormSchema(createAlloyRequest, unit).safeParse(values);

const faultsOf = (values: AlloyFormValues): Readonly<Record<string, string>> =>
  Object.fromEntries(
    (read(values).error?.issues ?? []).map(({ path, message }) => [path.join('.'), message]),
  );

describe('alloyFormSchema', () => {
  it('reads decimal commas, minutes and symbols as they are meant', () => {
    expect(read(sterling).data).toMatchObject({
      compositionWt: { Ag: 92.5, Cu: 7.5 },
      toleranceWt: { Ag: 0.3 },
      fineness: 925,
      quench: { earliestS: 750, latestS: null },
      measured: null,
    });
  });

  it('refuses what is not a number at its own field, without guessing', () => {
    const faults = faultsOf({
      ...sterling,
      parts: [{ symbol: 'Ag', wt: '92.5.1', tolerance: '' }, sterling.parts[1] ?? emptyAlloyForm.parts[0]!],
    });
    expect(faults['parts.0.wt']).toMatch(/not a number/);
  });

  it('asks for a composition of 100 as a whole', () => {
    const faults = faultsOf({
      ...sterling,
      parts: [
        { symbol: 'Ag', wt: '92', tolerance: '' },
        { symbol: 'Cu', wt: '7.5', tolerance: '' },
      ],
    });
    expect(faults).toEqual({ parts: 'The parts must come to 100 wt%.' });
  });

  it('refuses a metal that stands twice and a word that is no symbol', () => {
    const parts = [
      { symbol: 'Ag', wt: '50', tolerance: '' },
      { symbol: 'ag', wt: '50', tolerance: '' },
      { symbol: 'gold', wt: '1', tolerance: '' },
    ];
    const faults = faultsOf({ ...sterling, parts });
    expect(faults['parts.1.symbol']).toMatch(/already stands/);
    expect(faults['parts.2.symbol']).toMatch(/element symbol/);
  });

  it('leaves out a row that is wholly empty', () => {
    expect(
      read({ ...sterling, parts: [...sterling.parts, { symbol: '', wt: ' ', tolerance: '' }] }).success,
    ).toBe(true);
  });

  it('wants every part of a measured range once it is asked for, in the studio’s degrees', () => {
    expect(Object.keys(faultsOf({ ...sterling, isMeasured: true }))).toEqual(
      expect.arrayContaining([
        'measured.solidus',
        'measured.liquidus',
        'measured.density',
        'measured.source',
      ]),
    );
    const measured = { solidus: '1630', liquidus: '1700', density: '10,3', source: 'The maker’s sheet.' };
    const data = read({ ...sterling, isMeasured: true, measured }, 'F').data;
    // 1630 °F is 887.778 °C.
    expect(data?.measured?.solidusC).toBeCloseTo(887.778, 3);
  });

  it('places a latest quench before the earliest at the latest', () => {
    const faults = faultsOf({ ...sterling, quench: { ...sterling.quench, latest: '2' } });
    expect(faults['quench.latest']).toMatch(/after the earliest/);
  });

  it('asks for the family in words', () => {
    expect(faultsOf({ ...sterling, family: '' })['family']).toBe('Choose one.');
  });
});

describe('formPathOf', () => {
  it.each([
    ['compositionWt.Cu', 'parts.1.wt'],
    ['toleranceWt.Ag', 'parts.0.tolerance'],
    ['toleranceWt', 'parts'],
    ['measured', 'isMeasured'],
    ['quench.latestS', 'quench.latest'],
    ['fineness', 'fineness'],
  ])('finds the field of %s', (path, field) => {
    expect(formPathOf(path, sterling.parts)).toBe(field);
  });
});

describe('the running sum', () => {
  it('adds up what can be read and says what is missing', () => {
    expect(sumSentence(sumOfParts([{ wt: '92,5' }, { wt: 'x' }]))).toBe('Sum 92.5 wt%: 7.5 missing.');
    expect(sumSentence(100.2)).toBe('Sum 100.2 wt%: 0.2 too much.');
    expect(sumSentence(100)).toBe('Sum 100 wt%: complete.');
    expect(sumSentence(99.99)).toBe('Sum 99.99 wt%: 0.01 missing.');
    expect(sumSentence(99.99, wholeOfLot('fine'))).toBe('Sum 99.99 wt%: complete.');
  });
});
