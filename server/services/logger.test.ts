import { expect, it } from 'vitest';
import { createLogger } from './logger.ts';

it('writes one line an entry, with its details as JSON on the same line', () => {
  const lines: string[] = [];
  const logger = createLogger((line) => lines.push(line));
  logger.warn('The mail server does not answer.', { code: 'ECONNREFUSED', note: 'a\nb' });
  logger.error('No details');
  expect(lines[0]).toMatch(
    /^\d{4}-\d\d-\d\dT[\d:.]+Z warn The mail server does not answer\. \{"code":"ECONNREFUSED","note":"a\\nb"\}\n$/,
  );
  expect(lines[1]).toMatch(/Z error No details\n$/);
});
