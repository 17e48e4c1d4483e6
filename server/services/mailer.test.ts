import type { AddressInfo } from 'node:net';
import { SMTPServer } from 'smtp-server';
import { afterEach, expect, it } from 'vitest';
import { createLogger } from './logger.ts';
import { createMailer } from './mailer.ts';

let server: SMTPServer | null = null;

afterEach(async () => {
  await new Promise<void>((resolve) => (server ? server.close(() => resolve()) : resolve()));
  server = null;
});

/** A mail server on loopback that keeps what it is given. */
const startMailServer = async (received: string[]): Promise<number> => {
  const started = new SMTPServer({
    authOptional: true,
    disabledCommands: ['STARTTLS'],
    onData: (stream, _session, done) => {
      const parts: Buffer[] = [];
      stream.on('data', (part: Buffer) => parts.push(part));
      stream.on('end', () => {
        received.push(Buffer.concat(parts).toString());
        done();
      });
    },
  });
  server = started;
  await new Promise<void>((resolve) => started.listen(0, '127.0.0.1', resolve));
  return (started.server.address() as AddressInfo).port;
};

const letter = { to: ['owner@example.org'], subject: 'A notice', text: 'Ten wrong PINs.' };

it('hands a letter to the mail server', async () => {
  const received: string[] = [];
  const port = await startMailServer(received);
  await createMailer(
    `smtp://127.0.0.1:${port}`,
    createLogger(() => {}),
  )(letter);
  expect(received).toHaveLength(1);
  expect(received[0]).toContain('Subject: A notice');
  expect(received[0]).toContain('Ten wrong PINs.');
});

it('stops nothing when the mail server is away, and says so in the log', async () => {
  const lines: string[] = [];
  await createMailer(
    'smtp://127.0.0.1:9',
    createLogger((line) => lines.push(line)),
  )(letter);
  expect(lines.join('')).toMatch(/could not be handed to the mail server/);
});

it('says in the log that no mail server is set', async () => {
  const lines: string[] = [];
  await createMailer(
    undefined,
    createLogger((line) => lines.push(line)),
  )(letter);
  expect(lines.join('')).toMatch(/SMTP_URL/);
});
