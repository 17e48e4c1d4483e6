import { z } from 'zod';
import {
  createPersonRequest,
  updatePersonRequest,
  type CreatePersonRequest,
  type Person,
  type UpdatePersonRequest,
} from '#shared/contracts/person.ts';
import type { Role } from '#shared/domain/people/role.ts';

/** A person's form as it is typed. */
export interface PersonValues {
  readonly name: string;
  readonly login: string;
  readonly email: string;
  readonly roles: Role[];
  readonly active: boolean;
  readonly password: string;
  readonly pin: string;
  readonly removePin: boolean;
}

/** The form of a new person. */
export const emptyPerson: PersonValues = {
  name: '',
  login: '',
  email: '',
  roles: [],
  active: true,
  password: '',
  pin: '',
  removePin: false,
};

/** The form of a person as they are; password and PIN are never sent back, so they begin empty. */
export const valuesOf = ({ name, login, email, roles, active }: Person): PersonValues => ({
  ...emptyPerson,
  name,
  login,
  email: email ?? '',
  roles: [...roles],
  active,
});

const toCreate = ({ name, login, email, roles, password, pin }: PersonValues): CreatePersonRequest => ({
  name,
  login,
  email,
  roles,
  password,
  pin: pin === '' ? null : pin,
});

const toUpdate = (values: PersonValues): UpdatePersonRequest => {
  const { name, login, email, roles, active, password, pin, removePin } = values;
  return {
    name,
    login,
    email,
    roles,
    active,
    ...(password === '' ? {} : { password }),
    ...(removePin ? { pin: null } : pin === '' ? {} : { pin }),
  };
};

/** Reads the form of a new person: without a PIN they cannot sign in at a terminal. */
export const newPersonForm = z.custom<PersonValues>().transform(toCreate).pipe(createPersonRequest);

/** Reads the form of a person who is changed: an empty password or PIN stays as it was. */
export const changedPersonForm = z.custom<PersonValues>().transform(toUpdate).pipe(updatePersonRequest);
