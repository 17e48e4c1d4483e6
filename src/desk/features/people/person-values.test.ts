import { describe, expect, it } from 'vitest';
import type { Person } from '#shared/contracts/person.ts';
import {
  changedPersonForm,
  emptyPerson,
  newPersonForm,
  valuesOf,
  type PersonValues,
} from './person-values.ts';

const typed: PersonValues = {
  ...emptyPerson,
  name: 'Ada Quill',
  login: 'ada',
  roles: ['caster'],
  password: 'twelve or more letters',
};

const faultsOf = (result: { error?: { issues: readonly { path: readonly PropertyKey[] }[] } }) =>
  (result.error?.issues ?? []).map(({ path }) => path.join('.'));

describe('newPersonForm', () => {
  it('takes a person without a PIN and without an address', () => {
    expect(newPersonForm.parse(typed)).toEqual({
      name: 'Ada Quill',
      login: 'ada',
      email: null,
      roles: ['caster'],
      password: 'twelve or more letters',
      pin: null,
    });
  });

  it('puts every fault at its field', () => {
    const faults = faultsOf(newPersonForm.safeParse({ ...emptyPerson, email: 'nowhere', pin: '12' }));
    expect(faults.toSorted()).toEqual(
      ['email', 'login', 'login', 'name', 'password', 'pin', 'roles'].toSorted(),
    );
  });
});

describe('changedPersonForm', () => {
  it('leaves password and PIN alone while they are empty', () => {
    expect(changedPersonForm.parse({ ...typed, password: '' })).toEqual({
      name: 'Ada Quill',
      login: 'ada',
      email: null,
      roles: ['caster'],
      active: true,
    });
  });

  it('sets a PIN, or takes it away', () => {
    expect(changedPersonForm.parse({ ...typed, pin: '246802' })).toMatchObject({ pin: '246802' });
    expect(changedPersonForm.parse({ ...typed, pin: '246802', removePin: true })).toMatchObject({
      pin: null,
    });
  });
});

describe('the limits of an apprentice', () => {
  const apprentice: PersonValues = { ...typed, roles: ['apprentice'] };
  const limitsOf = (values: PersonValues) => changedPersonForm.parse(values).apprenticeship;

  it('are none, or some alloys and parts; the guard is always theirs and the pour is one', () => {
    expect(limitsOf(apprentice)).toEqual({ alloyIds: null, parts: null });
    const alloyIds = ['3f0b2c9e-5a44-4b0e-9d55-0a6a52a6c6d1'];
    const some = { ...apprentice, everyAlloy: false, alloyIds, everyPart: false };
    expect(limitsOf({ ...some, parts: ['charge', 'pour'] })).toEqual({
      alloyIds,
      parts: ['guard', 'charge', 'flask-out', 'pour', 'quench'],
    });
  });

  it('are not sent for someone who works as a caster too', () => {
    expect(limitsOf({ ...apprentice, roles: ['apprentice', 'caster'], everyPart: false })).toBeUndefined();
  });

  it('come back into the form as they went out', () => {
    const parts = ['guard', 'melt', 'close'] as const;
    const person = { ...typed, apprenticeship: { alloyIds: [], parts } } as unknown as Person;
    expect(valuesOf(person)).toMatchObject({
      everyAlloy: false,
      alloyIds: [],
      everyPart: false,
      parts: ['melt', 'close'],
    });
  });
});
