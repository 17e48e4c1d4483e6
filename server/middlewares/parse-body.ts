import express, { type ErrorRequestHandler } from 'express';
import { AppError } from '../errors.ts';

/** PostgreSQL stores neither the null character nor half a surrogate pair, so such text is refused at the door. */
const refuseUnstorable = (_key: string, value: unknown): unknown => {
  const isUnstorable = (text: string): boolean => text.includes('\u0000') || !text.isWellFormed();
  const texts =
    typeof value === 'string'
      ? [value]
      : value !== null && typeof value === 'object'
        ? Object.keys(value)
        : [];
  if (texts.some(isUnstorable)) throw new SyntaxError('The text holds a character that cannot be stored.');
  return value;
};

/** Reads JSON bodies of at most 256 kB. */
export const parseBody = express.json({ limit: '256kb', reviver: refuseUnstorable });

/** Turns what the body parser refuses into errors of our own. */
export const explainBodyErrors: ErrorRequestHandler = (
  error: Error & { readonly type?: string; readonly status?: number },
  _request,
  _response,
  next,
) => {
  if (error instanceof AppError) return next(error);
  if (error.type === 'entity.too.large')
    return next(new AppError('too-large', 'The request is larger than 256 kB.'));
  // A body that cannot be unpacked carries a status and no type.
  if (error.status !== undefined && error.status < 500)
    return next(new AppError('invalid-request', 'The request could not be read as JSON.'));
  return next(error);
};
