import { z } from 'zod';
import {
  createPersonRequest,
  updatePersonRequest,
  type CreatePersonRequest,
  type Person,
  type UpdatePersonRequest,
} from '#shared/contracts/person.ts';
import { workerRoleOf, type Apprenticeship } from '#shared/domain/people/apprenticeship.ts';
import type { Role } from '#shared/domain/people/role.ts';
import type { CardStep } from '#shared/domain/pour-card/card-step.ts';

/** What an apprentice may be kept from; flask out, pour and quench follow one another too fast to be parted. */
export const partChoices = ['charge', 'melt', 'pour', 'close'] as const;
/** One of them. */
export type PartChoice = (typeof partChoices)[number];

const partsOf: Readonly<Record<PartChoice, readonly CardStep[]>> = {
  charge: ['charge'],
  melt: ['melt'],
  pour: ['flask-out', 'pour', 'quench'],
  close: ['close'],
};

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
  readonly everyAlloy: boolean;
  readonly alloyIds: string[];
  readonly everyPart: boolean;
  readonly parts: PartChoice[];
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
  everyAlloy: true,
  alloyIds: [],
  everyPart: true,
  parts: [...partChoices],
};

/** The form of a person as they are; password and PIN are never sent back, so they begin empty. */
export const valuesOf = ({
  name,
  login,
  email,
  roles,
  active,
  apprenticeship: { alloyIds, parts },
}: Person): PersonValues => ({
  ...emptyPerson,
  name,
  login,
  email: email ?? '',
  roles: [...roles],
  active,
  everyAlloy: alloyIds === null,
  alloyIds: [...(alloyIds ?? [])],
  everyPart: parts === null,
  parts: partChoices.filter((part) => parts === null || partsOf[part].every((each) => parts.includes(each))),
});

/** Everyone who opens a card does its guard. */
const toApprenticeship = ({ everyAlloy, alloyIds, everyPart, parts }: PersonValues): Apprenticeship => ({
  alloyIds: everyAlloy ? null : alloyIds,
  parts: everyPart ? null : ['guard', ...parts.flatMap((part) => partsOf[part])],
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
    // The contract's arrays are mutable where the domain's are not.
    ...(workerRoleOf(roles) === 'apprentice' ? { apprenticeship: toApprenticeship(values) as never } : {}),
    ...(password === '' ? {} : { password }),
    ...(removePin ? { pin: null } : pin === '' ? {} : { pin }),
  };
};

/** Reads the form of a new person: without a PIN they cannot sign in at a terminal. */
export const newPersonForm = z.custom<PersonValues>().transform(toCreate).pipe(createPersonRequest);

/** Reads the form of a person who is changed: an empty password or PIN stays as it was. */
export const changedPersonForm = z.custom<PersonValues>().transform(toUpdate).pipe(updatePersonRequest);
