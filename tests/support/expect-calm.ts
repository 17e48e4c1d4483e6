import type { Response } from 'supertest';
import { expect } from 'vitest';

/** Long enough for a slow machine; what takes longer hangs. */
export const ANSWER_MS = 10_000;

/** Whatever was sent: an answer, in our own form when it is a refusal, and never a failure. */
export const expectCalm = (response: Response): void => {
  expect(response.status, response.text).toBeLessThan(500);
  if (response.status < 400) return;
  expect(response.type).toBe('application/problem+json');
  const { title, status, type } = response.body as Record<string, unknown>;
  expect(title).toEqual(expect.stringMatching(/\S/));
  expect(status).toBe(response.status);
  expect(type).toMatch(/^urn:ladlemark:problem:[a-z-]+$/);
};
