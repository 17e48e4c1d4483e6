import type { Response } from 'supertest';

/** The JSON an answer carries, as yet unread. */
export const bodyOf = (response: Response): unknown => response.body as unknown;
