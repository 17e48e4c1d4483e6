import type { Request } from 'express';
import type { Instrument } from '../models/instrument.ts';
import type { Terminal } from '../models/terminal.ts';
import { hashToken } from '../services/hashing.ts';
import type { Services } from '../services/services.ts';

const shape = /^Bearer ([A-Za-z0-9_-]{20,200})$/;

/** The token in a request's Authorization header, or null. No page of another site can set it without being asked first. */
export const bearerTokenOf = (request: Request): string | null =>
  shape.exec(request.get('authorization') ?? '')?.[1] ?? null;

/** Whose token it is: an instrument's or a terminal's that is still in use. */
export interface Bearer {
  readonly instrument: Instrument | null;
  readonly terminal: Terminal | null;
}

/** The instrument or terminal a request comes from by the token it bears; both null where it bears none that is known. */
export const bearerOf = async (request: Request, { models }: Services): Promise<Bearer> => {
  const token = bearerTokenOf(request);
  if (token === null) return { instrument: null, terminal: null };
  const tokenHash = hashToken(token);
  const instrument = await models.Instrument.findOne({ where: { tokenHash, active: true } });
  const terminal = instrument
    ? null
    : await models.Terminal.findOne({ where: { tokenHash, revokedAt: null } });
  return { instrument, terminal };
};
