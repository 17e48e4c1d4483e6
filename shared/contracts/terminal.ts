import { z } from 'zod';
import { words, type Abilities } from './common.ts';

/** Makes a one-time code with which a device becomes a terminal. */
export const createEnrolmentRequest = z.object({
  name: words(60, 'Name the terminal.'),
  bay: words(60, 'Say where it stands.'),
});
/** Makes a one-time code with which a device becomes a terminal. */
export type CreateEnrolmentRequest = z.infer<typeof createEnrolmentRequest>;

/** Enrols the device that sends it. */
export const enrolTerminalRequest = z.object({
  code: z
    .string({ error: 'Type the code from the desk.' })
    .transform((code) => code.replace(/\D/g, ''))
    .pipe(z.string().regex(/^\d{8}$/, 'The code has eight digits.')),
});
/** Enrols the device that sends it. */
export type EnrolTerminalRequest = z.input<typeof enrolTerminalRequest>;

/** A one-time enrolment code; shown once. */
export interface Enrolment {
  readonly code: string;
  readonly name: string;
  readonly bay: string;
  readonly expiresAt: string;
}

/** A device that may sign people in by PIN. */
export interface Terminal {
  readonly id: string;
  readonly name: string;
  readonly bay: string;
  readonly enrolledAt: string;
  readonly lastSeenAt: string | null;
  readonly revokedAt: string | null;
  readonly abilities: Abilities<'revoke'>;
}
