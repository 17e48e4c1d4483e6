import type { Request, Response } from 'express';

/** A request with the response it will get. */
export interface Http {
  readonly request: Request;
  readonly response: Response;
}
