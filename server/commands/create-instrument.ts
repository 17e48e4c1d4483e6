import { randomBytes } from 'node:crypto';
import { UniqueConstraintError } from 'sequelize';
import type { CreateInstrumentRequest } from '#shared/contracts/instrument.ts';
import { fieldError } from '../errors.ts';
import type { Instrument } from '../models/instrument.ts';
import type { SignedIn } from '../policies/actor.ts';
import { hashToken } from '../services/hashing.ts';
import type { Services } from '../services/services.ts';

/** Enters an instrument; its token is told once and only its hash is kept. */
export const createInstrument = (
  { sequelize, models, now }: Services,
  { person }: SignedIn,
  { terminalId, ...request }: CreateInstrumentRequest,
): Promise<{ readonly instrument: Instrument; readonly token: string }> =>
  sequelize.transaction(async () => {
    const terminal =
      terminalId && (await models.Terminal.findOne({ where: { id: terminalId, revokedAt: null } }));
    if (terminalId && !terminal)
      throw fieldError('terminalId', 'That terminal is not in use. Choose another.');
    const token = randomBytes(32).toString('base64url');
    try {
      const instrument = await models.Instrument.create({
        ...request,
        terminalId,
        tokenHash: hashToken(token),
        createdBy: person.id,
        createdAt: now(),
      });
      return { instrument, token };
    } catch (error) {
      if (error instanceof UniqueConstraintError)
        throw fieldError('name', 'Another instrument in use has that name.');
      throw error;
    }
  });
