import { randomBytes } from 'node:crypto';
import { fieldError } from '../errors.ts';
import type { Terminal } from '../models/terminal.ts';
import { hashToken } from '../services/hashing.ts';
import type { Services } from '../services/services.ts';

/** Turns a one-time code into a terminal; the token goes into the device's cookie and is not kept here. */
export const enrolTerminal = ({ sequelize, models, now }: Services, code: string) =>
  sequelize.transaction(async (): Promise<{ readonly terminal: Terminal; readonly token: string }> => {
    const enrolment = await models.TerminalEnrolment.findOne({
      where: { codeHash: hashToken(code) },
      lock: true,
    });
    if (!enrolment) throw fieldError('code', 'That code is not right. Read it again at the desk.');
    if (enrolment.usedAt || enrolment.expiresAt <= now()) {
      throw fieldError('code', 'That code is used up or too old. Make a new one at the desk.');
    }
    await enrolment.update({ usedAt: now() });
    const token = randomBytes(32).toString('base64url');
    const { name, bay } = enrolment;
    const terminal = await models.Terminal.create({
      name,
      bay,
      tokenHash: hashToken(token),
      lastSeenAt: now(),
    });
    return { terminal, token };
  });
