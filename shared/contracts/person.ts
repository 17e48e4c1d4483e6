import { z } from 'zod';
import type { Apprenticeship } from '#shared/domain/people/apprenticeship.ts';
import { roles, type Role } from '#shared/domain/people/role.ts';
import { cardSteps, type CardStep } from '#shared/domain/pour-card/card-step.ts';
import { words, type Abilities } from './common.ts';
import { pin } from './session.ts';

const name = words(80, 'Type the person’s name.');
const login = words(60, 'Type a sign-in name.').regex(
  /^[\p{L}\p{N}._-]+$/u,
  'Use letters, digits, dot, dash or underscore.',
);
const password = z
  .string({ error: 'Type a password.' })
  .min(12, 'Use twelve characters or more; a short sentence works well.')
  .max(200, 'Keep it under 200 characters.');
const email = z
  .union([
    z.literal('').transform(() => null),
    z.null(),
    z.email('That is not an e-mail address.').max(200, 'Keep it under 200 characters.'),
  ])
  .default(null);
const roleList = z
  .array(z.enum(roles), { error: 'Choose at least one role.' })
  .min(1, 'Choose at least one role.')
  .max(roles.length)
  .refine((list) => new Set(list).size === list.length, 'Each role counts once.');

const pourParts: readonly CardStep[] = ['flask-out', 'pour', 'quench'];

/** What an apprentice may do: which alloys, which parts of a card; null for all of them. */
export const apprenticeship = z
  .object({
    alloyIds: z.array(z.uuid()).max(200).nullable(),
    parts: z.array(z.enum(cardSteps)).max(cardSteps.length).nullable(),
  })
  .refine(
    ({ parts }) =>
      parts === null ||
      pourParts.every((part) => parts.includes(part)) ||
      !pourParts.some((part) => parts.includes(part)),
    { error: 'Flask out, pour and quench follow one another too fast to be parted.', path: ['parts'] },
  ) satisfies z.ZodType<Apprenticeship>;

/** Adds a person. */
export const createPersonRequest = z.object({
  name,
  login,
  email,
  roles: roleList,
  password,
  pin: pin.nullable(),
});
/** Adds a person. */
export type CreatePersonRequest = z.input<typeof createPersonRequest>;

/** Changes a person; what is left out stays. */
export const updatePersonRequest = z
  .object({
    name,
    login,
    email: email.unwrap(),
    roles: roleList,
    active: z.boolean(),
    password,
    pin: pin.nullable(),
    apprenticeship,
  })
  .partial()
  .refine((change) => Object.keys(change).length > 0, 'Nothing was changed.');
/** Changes a person; what is left out stays. */
export type UpdatePersonRequest = z.input<typeof updatePersonRequest>;

/** A person as the owner sees them. */
export interface Person {
  readonly id: string;
  readonly name: string;
  readonly login: string;
  /** Where notices go; null for none. */
  readonly email: string | null;
  readonly roles: readonly Role[];
  readonly active: boolean;
  readonly hasPin: boolean;
  /** Whether wrong PINs have locked the terminal sign-in until the owner opens it again. */
  readonly pinLocked: boolean;
  readonly apprenticeship: Apprenticeship;
  readonly abilities: Abilities<'update' | 'unlock'>;
}

/** A person as the terminal's sign-in shows them. */
export interface PersonAtTerminal {
  readonly id: string;
  readonly name: string;
  readonly roles: readonly Role[];
}
