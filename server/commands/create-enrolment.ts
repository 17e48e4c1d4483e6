import { randomInt } from 'node:crypto';
import type { CreateEnrolmentRequest, Enrolment } from '#shared/contracts/terminal.ts';
import type { SignedIn } from '../policies/actor.ts';
import { hashToken } from '../services/hashing.ts';
import type { Services } from '../services/services.ts';

const validForMs = 15 * 60 * 1000;

/** Makes a one-time code of eight digits, good for fifteen minutes, with which a device becomes a terminal. */
export const createEnrolment = async (
  { sequelize, models, now }: Services,
  { person }: SignedIn,
  { name, bay }: CreateEnrolmentRequest,
): Promise<Enrolment> => {
  const code = String(randomInt(0, 100_000_000)).padStart(8, '0');
  const expiresAt = new Date(now().getTime() + validForMs);
  await sequelize.transaction(() =>
    models.TerminalEnrolment.create({
      codeHash: hashToken(code),
      name,
      bay,
      createdBy: person.id,
      expiresAt,
    }),
  );
  return { code, name, bay, expiresAt: expiresAt.toISOString() };
};
