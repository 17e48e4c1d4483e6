import type { ErrorRequestHandler, RequestHandler } from 'express';
import { ConnectionError, ConnectionAcquireTimeoutError } from 'sequelize';
import { problemType, type Problem } from '#shared/contracts/problem.ts';
import { AppError } from '../errors.ts';
import type { Logger } from '../services/logger.ts';

/** Codes with which PostgreSQL says that it is going down, coming up or full, rather than that a query is wrong. */
const unavailableCodes = ['57P01', '57P02', '57P03', '53300', '08006', '08003', 'ECONNREFUSED', 'ECONNRESET'];

/** What the driver says, without a code, of a connection that broke under a query or before it. */
const brokenConnection = /^Connection terminated|is not queryable$|connection manager was closed/;

const isUnavailable = (error: unknown): boolean => {
  const { code, parent, message } = (error ?? {}) as {
    code?: string;
    parent?: Error & { code?: string };
    message?: string;
  };
  return (
    error instanceof ConnectionError ||
    error instanceof ConnectionAcquireTimeoutError ||
    unavailableCodes.includes(parent?.code ?? code ?? '') ||
    brokenConnection.test(parent?.message ?? message ?? '')
  );
};

/** The status a library blames on the request: a file that is not there, a path that cannot be read. */
const blamedStatus = (error: unknown): number | null => {
  const { status } = (error ?? {}) as { status?: unknown };
  return typeof status === 'number' && status >= 400 && status < 500 ? status : null;
};

const nothingHere = (): AppError => new AppError('not-found', 'There is nothing at this address.');

const asAppError = (error: unknown): AppError | null => {
  if (error instanceof AppError) return error;
  if (isUnavailable(error))
    return new AppError('not-ready', 'The database is not ready. Nothing was stored; try again in a moment.');
  switch (blamedStatus(error)) {
    case null:
      return null;
    case 404:
      return nothingHere();
    default:
      return new AppError('invalid-request', 'That address cannot be read.');
  }
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
  throw nothingHere();
};
