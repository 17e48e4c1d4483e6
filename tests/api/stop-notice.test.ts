import { randomUUID } from 'node:crypto';
import { afterAll, afterEach, beforeAll, describe, expect, it } from 'vitest';
import type { Letter } from '#server/services/mailer.ts';
import { recordEvent } from '#server/commands/record-event.ts';
import type { Melt } from '#server/models/melt.ts';
import { buildMelt } from '#tests/factories/build-melt.ts';
import { buildTerminal } from '#tests/factories/build-terminal.ts';
import { buildUser } from '#tests/factories/build-user.ts';
import { START, startTestServer, type TestServer } from '#tests/support/test-server.ts';
import { waitFor } from '#tests/support/wait-for.ts';

let server: TestServer;
beforeAll(async () => {
  server = await startTestServer();
  await buildUser(server.services, { roles: ['owner'], email: 'owner@example.org' });
  await buildUser(server.services, { roles: ['caster'], email: 'caster@example.org' });
  await buildUser(server.services, { roles: ['owner'], email: 'gone@example.org', active: false });
});
afterEach(() => server.expectNoSurprises());
afterAll(() => server.close());

/** Stops a card that is at its charge, with what is handed to the mail server collected. */
const stopWith = async (mailer: (letter: Letter) => Promise<void>) => {
  const person = await buildUser(server.services);
  const { terminal } = await buildTerminal(server.services);
  const melt = await buildMelt(server.services, { user: person, terminal, step: 'charge' });
  const actor = { person, terminal, via: 'terminal' } as const;
  const event = { type: 'stopped', reason: 'spill' } as const;
  const request = { key: randomUUID(), occurredAt: START, event };
  const stop = () => recordEvent({ ...server.services, mailer }, actor, melt.id, request);
  return { melt, person, terminal, stop };
};

const isStopped = async ({ id }: Melt): Promise<boolean> =>
  (await server.services.models.Melt.findByPk(id, { rejectOnEmpty: true })).state.stopped === 'spill';

describe('stop work', () => {
  it('tells the owners why, who and where, once however often it is delivered', async () => {
    const letters: Letter[] = [];
    const { melt, person, terminal, stop } = await stopWith((letter) => {
      letters.push(letter);
      return Promise.resolve();
    });
    await stop();
    await stop();
    await waitFor('the letter', () => letters.length > 0);
    expect(letters).toHaveLength(1);
    expect(letters[0]?.to).toEqual(['owner@example.org']);
    for (const word of ['a spill', person.name, melt.code, terminal.name, terminal.bay])
      expect(letters[0]?.text).toContain(word);
  });

  it('is recorded while the mail server never answers, and when it fails', async () => {
    const silent = await stopWith(() => new Promise(() => {}));
    await silent.stop();
    expect(await isStopped(silent.melt)).toBe(true);
    const broken = await stopWith(() => Promise.reject(new Error('no route')));
    await broken.stop();
    expect(await isStopped(broken.melt)).toBe(true);
  });
});
