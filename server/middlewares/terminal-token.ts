import { parseCookie } from 'cookie';
import type { Request } from 'express';
import type { Terminal } from '../models/terminal.ts';
import { hashToken } from '../services/hashing.ts';
import type { Services } from '../services/services.ts';
import type { Http } from './http.ts';

const cookieName = 'ladlemark-token';
/** A terminal stays enrolled until the owner ends it; browsers keep a cookie for 400 days at most. */
const maxAgeMs = 400 * 24 * 60 * 60 * 1000;
/** How often a terminal's last sign of life is written down. */
const seenEveryMs = 60_000;

/** Hands the device its token, which no script can read. */
export const keepTerminalToken = ({ request, response }: Http, token: string): void => {
  response.cookie(cookieName, token, {
    httpOnly: true,
    sameSite: 'strict',
    secure: request.secure,
    maxAge: maxAgeMs,
    path: '/',
  });
};

/** The enrolled terminal a request comes from, or null. */
export const terminalOf = async (request: Request, { models, now }: Services): Promise<Terminal | null> => {
  const token = parseCookie(request.get('cookie') ?? '')[cookieName];
  if (!token) return null;
  const terminal = await models.Terminal.findOne({ where: { tokenHash: hashToken(token), revokedAt: null } });
  if (terminal && now().getTime() - (terminal.lastSeenAt?.getTime() ?? 0) > seenEveryMs) {
    await terminal.update({ lastSeenAt: now() });
  }
  return terminal;
};
