import type { NextFunction, Request, Response } from 'express';
import { AppError } from '../errors.ts';
import { bearerTokenOf } from './bearer-token.ts';

/** The application a request comes from; each keeps its own session, so that one browser may hold both. */
export type Place = 'desk' | 'terminal';

/** The header in which our applications say which of them is asking. */
export const placeHeader = 'ladlemark-place';

/** Which application is asking; a request that does not say is the desk's. */
export const placeOf = (request: Request): Place =>
  request.get(placeHeader) === 'terminal' ? 'terminal' : 'desk';

/**
 * Refuses writes that another site could have sent: a page elsewhere can neither set our header without being asked
 * first, nor hide its origin. A logger's token is such a header too.
 */
export const refuseForeign = (request: Request, _response: Response, next: NextFunction): void => {
  const isWrite = request.method !== 'GET' && request.method !== 'HEAD';
  const origin = request.get('origin');
  const isMarked = request.get(placeHeader) !== undefined || bearerTokenOf(request) !== null;
  const isOurs =
    origin === undefined || (URL.canParse(origin) && new URL(origin).host === request.get('host'));
  if (isWrite && (!isMarked || !isOurs)) {
    throw new AppError('foreign-request', 'This request does not come from Ladlemark’s own pages.');
  }
  next();
};
