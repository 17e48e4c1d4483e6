import type { Request, Response } from 'express';
import type { z } from 'zod';
import type { Actor } from '../policies/actor.ts';
import type { Policy } from '../policies/policy.ts';
import type { Services } from '../services/services.ts';

/** What a route acts on: everything parsed, loaded and authorised. */
export interface RouteInput<Params, Query, Body, Subject> {
  readonly actor: Actor;
  readonly params: Params;
  readonly query: Query;
  readonly body: Body;
  readonly subject: Subject;
  readonly services: Services;
  /** For the few routes that deal in cookies and sessions. */
  readonly http: { readonly request: Request; readonly response: Response };
}

/** A route read top-down: who may, what is sent, what is loaded, what is done; `act` resolves to the answer's body. */
export interface RouteDefinition<Params, Query, Body, Subject> {
  readonly method: 'get' | 'post' | 'patch';
  readonly path: `/api/${string}`;
  readonly policy: Policy<Subject>;
  readonly params?: z.ZodType<Params>;
  readonly query?: z.ZodType<Query>;
  readonly body?: z.ZodType<Body>;
  readonly load?: (services: Services, params: Params) => Promise<Subject>;
  readonly act: (input: RouteInput<Params, Query, Body, Subject>) => Promise<unknown>;
  /** 200 unless said otherwise; null bodies answer 204. */
  readonly status?: number;
}

/** A route whose parts have been checked against each other. */
export type Route = RouteDefinition<unknown, unknown, unknown, unknown>;

/** Declares a route; a route without a policy does not compile. */
export const defineRoute = <Params = undefined, Query = undefined, Body = undefined, Subject = undefined>(
  definition: RouteDefinition<Params, Query, Body, Subject>,
): Route =>
  // The parts were checked against each other above; the list of all routes cannot carry their differing types.
  definition as unknown as Route;
