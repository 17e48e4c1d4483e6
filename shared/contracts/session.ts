import { z } from 'zod';
import type { MarkPlace } from '#shared/domain/metal/fineness-marks.ts';
import type { Role } from '#shared/domain/people/role.ts';
import type { Units } from '#shared/lib/units.ts';
import type { Abilities } from './common.ts';
import { words } from './common.ts';

/** Desk sign-in by name and password. */
export const signInRequest = z.object({
  login: words(60, 'Type your sign-in name.'),
  password: z
    .string({ error: 'Type your password.' })
    .min(1, 'Type your password.')
    .max(200, 'That password is too long.'),
});
/** Desk sign-in by name and password. */
export type SignInRequest = z.infer<typeof signInRequest>;

/** A PIN: six to twelve digits. */
export const pin = z
  .string({ error: 'Type your PIN.' })
  .regex(/^\d{6,12}$/, 'A PIN is six to twelve digits.');

/** Terminal sign-in by person and PIN. */
export const pinSignInRequest = z.object({ personId: z.uuid('Choose who you are.'), pin });
/** Terminal sign-in by person and PIN. */
export type PinSignInRequest = z.infer<typeof pinSignInRequest>;

/** What a desk may show to the person signed in. */
export const deskAbilities = [
  'seeDesk',
  'managePeople',
  'manageTerminals',
  'manageAlloys',
  'editStudio',
  'runCards',
] as const;

/** Who is signed in, where, and what may be shown. */
export interface Session {
  readonly person: { readonly id: string; readonly name: string; readonly roles: readonly Role[] } | null;
  readonly terminal: { readonly id: string; readonly name: string; readonly bay: string } | null;
  readonly via: 'desk' | 'terminal' | null;
  readonly studio: {
    readonly name: string;
    readonly units: Units;
    readonly idleLockS: number;
    readonly timeZone: string;
    /** Whose fineness marks the studio works to. */
    readonly marksPlace: MarkPlace;
  };
  readonly abilities: Abilities<(typeof deskAbilities)[number]>;
  /** The server's clock, ISO 8601: terminals keep the offset. */
  readonly serverTime: string;
}
