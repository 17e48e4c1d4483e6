import { describe, expect, it } from 'vitest';
import { changedPersonForm, emptyPerson, newPersonForm, type PersonValues } from './person-values.ts';

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
