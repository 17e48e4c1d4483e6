import type { ErrorRequestHandler, RequestHandler } from 'express';
import { ConnectionError, ConnectionAcquireTimeoutError } from 'sequelize';
import { problemType, type Problem } from '#shared/contracts/problem.ts';
import { AppError } from '../errors.ts';
import type { Logger } from '../services/logger.ts';

/** Codes with which PostgreSQL says that it is going down, coming up or full, rather than that a query is wrong. */
const unavailableCodes = ['57P01', '57P02', '57P03', '53300', '08006', '08003', 'ECONNREFUSED', 'ECONNRESET'];

const isUnavailable = (error: unknown): boolean => {
  const { code, parent } = (error ?? {}) as { code?: string; parent?: { code?: string } };
  return (
    error instanceof ConnectionError ||
    error instanceof ConnectionAcquireTimeoutError ||
    unavailableCodes.includes(parent?.code ?? code ?? '')
  );
};

const asAppError = (error: unknown): AppError | null => {
  if (error instanceof AppError) return error;
  if (isUnavailable(error))
    return new AppError('not-ready', 'The database is not ready. Nothing was stored; try again in a moment.');
  // Express refuses a path it cannot decode before any route is asked.
  if (error instanceof URIError) return new AppError('invalid-request', 'That address cannot be read.');
  return null;
};

const toProblem = ({ id, status, message, details }: AppError): Problem => ({
  type: problemType(id),
  title: message,
  status,
  ...details,
});

/** Answers every error in one form, RFC 9457 problem details; what nobody foresaw is logged and told without its insides. */
export const answerErrors =
  (logger: Logger): ErrorRequestHandler =>
  (error: unknown, request, response, next) => {
    if (response.headersSent) return next(error);
    const known = asAppError(error);
    if (!known || known.status >= 500) {
      logger.error('A request failed.', {
        method: request.method,
        path: request.path,
        error: error instanceof Error ? (error.stack ?? error.message) : String(error),
      });
    }
    const problem = toProblem(
      known ??
        new AppError(
          'unexpected',
          'Something went wrong here. Nothing was stored; try again, and tell the owner if it stays.',
        ),
    );
    if (problem.retryAfterS !== undefined) response.set('Retry-After', String(problem.retryAfterS));
    response.status(problem.status).type('application/problem+json').send(JSON.stringify(problem));
  };

/** What is under `/api` and has no route. */
export const unknownRoute: RequestHandler = () => {
  throw new AppError('not-found', 'There is nothing at this address.');
};
