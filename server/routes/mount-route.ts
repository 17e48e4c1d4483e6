import type { Express, Request, Response } from 'express';
import type { z } from 'zod';
import type { FieldProblem } from '#shared/contracts/problem.ts';
import { AppError } from '../errors.ts';
import type { Actor } from '../policies/actor.ts';
import type { Policy } from '../policies/policy.ts';
import type { Services } from '../services/services.ts';
import type { Route } from './define-route.ts';

const authenticate = (actor: Actor, { who, refusal }: Policy<unknown>): void => {
  if (who(actor)) return;
  if (refusal === 'terminal-not-enrolled') {
    throw new AppError(refusal, 'This device is not a terminal yet. Type a code from the desk to enrol it.');
  }
  if (refusal === 'token-refused') {
    throw new AppError(
      refusal,
      'Send the token of an instrument or a terminal as “Authorization: Bearer …”; one that was ended no longer works.',
    );
  }
  if (actor.person === null) throw new AppError('not-signed-in', 'Sign in first.');
  throw new AppError('not-allowed', 'Your roles do not allow this. Ask the owner.');
};

/** What is said where a contract has no sentence of its own. */
const explain: z.core.$ZodErrorMap = ({ input }) =>
  input === undefined ? 'Something is missing from the request.' : 'The request is not in the form expected.';

const validate = <Value>(schema: z.ZodType<Value> | undefined, value: unknown): Value => {
  if (!schema) return undefined as Value;
  const parsed = schema.safeParse(value, { error: explain });
  if (parsed.success) return parsed.data;
  const fields: FieldProblem[] = parsed.error.issues.map(({ path, message }) => ({
    path: path.join('.'),
    message,
  }));
  throw new AppError('invalid-request', fields[0]?.message ?? 'The request could not be read.', { fields });
};

const authorise = (actor: Actor, policy: Policy<unknown>, subject: unknown): void => {
  if (policy.when?.(actor, subject) ?? true) return;
  throw new AppError(
    'not-allowed',
    'This cannot be done here and now by you. Load the page again to see what can.',
  );
};

const present = (response: Response, status: number, answer: unknown): void => {
  // A route that has answered by itself (health, with a status of its own) leaves nothing to send.
  if (response.headersSent) return;
  if (answer === null) response.status(204).end();
  else response.status(status).json(answer);
};

/** Mounts a route: authenticate, validate, load, authorise, act, present. */
export const mountRoute = (app: Express, services: Services, route: Route): void => {
  app[route.method](route.path, async (request: Request, response: Response) => {
    const { actor } = response.locals as { actor: Actor };
    authenticate(actor, route.policy);
    const params = validate(route.params, request.params);
    const query = validate(route.query, request.query);
    const subject = await route.load?.(services, params);
    authorise(actor, route.policy, subject);
    const body = validate(route.body, request.body);
    const answer = await route.act({
      actor,
      params,
      query,
      body,
      subject,
      services,
      http: { request, response },
    });
    present(response, route.status ?? 200, answer);
  });
};
