import type { Response } from 'supertest';

/** The cookies an answer sets, as a `Cookie` header would send them back. */
export const setCookiesOf = (response: Response): string =>
  (response.get('Set-Cookie') ?? []).map((cookie) => cookie.split(';')[0]).join('; ');
