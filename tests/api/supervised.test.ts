import { randomUUID } from 'node:crypto';
import { afterAll, afterEach, beforeAll, describe, expect, it } from 'vitest';
import type { Melt } from '#shared/contracts/melt.ts';
import type { SupervisedStep } from '#shared/contracts/supervised.ts';
import { buildCasting } from '#tests/factories/build-casting.ts';
import { buildUser } from '#tests/factories/build-user.ts';
import { enforceShippedInstruction } from '#tests/factories/enforce-shipped-instruction.ts';
import { driveCard, leadToFlaskOut, type DrivenCard } from '#tests/support/drive-card.ts';
import { problemIdOf } from '#tests/support/problem-id.ts';
import {
  START,
  startTestServer,
  type SignedInClient,
  type TerminalClient,
  type TestServer,
} from '#tests/support/test-server.ts';

let server: TestServer;
let owner: SignedInClient;
let apprentice: TerminalClient;
let card: DrivenCard;
let signerName: string;

/** A pour by an apprentice, signed for by a caster, with a departure whose reason the caster signs as well. */
beforeAll(async () => {
  server = await startTestServer();
  await enforceShippedInstruction(server.services);
  owner = await server.deskAs('owner');
  apprentice = await server.terminalAs('apprentice');
  const signer = await buildUser(server.services, { name: '=Signer "one"', roles: ['caster'] });
  signerName = signer.name;
  card = await driveCard(server, apprentice.client, (await buildCasting(server.services)).id);
  await leadToFlaskOut(card);
  const by = await card.sign(signer.id);
  await card.write({
    type: 'step-done',
    key: 'apprentice-pour',
    answer: { kind: 'countersign', by },
  });
  const { context } = await card.melt();
  await card.write({ type: 'flask-out', furnaceC: context.figures.flaskHoldC + 40 });
  await card.write({
    type: 'variance-explained',
    index: 0,
    reason: 'equipment',
    words: 'The furnace overshot.',
    hold: true,
    by: await card.sign(signer.id),
  });
});
afterEach(() => server.expectNoSurprises());
afterAll(() => server.close());

const record = async (personId: string): Promise<SupervisedStep[]> =>
  (await owner.client.get(`/api/people/${personId}/supervised`).expect(200)).body as SupervisedStep[];

describe('the record of what was done under supervision', () => {
  it('names each signed step and departure, newest first, with its melt and who signed', async () => {
    const { code, id, state } = await card.melt();
    const melt = { meltId: id, meltCode: code, at: START, signedBy: signerName, onDevice: false };
    expect(await record(apprentice.user.id)).toEqual([
      {
        ...melt,
        kind: 'variance',
        sentence: state.departures[0]?.sentence,
        words: 'The furnace overshot.',
      },
      {
        ...melt,
        kind: 'step',
        sentence: 'A caster looks at melt, machine and clothing, and signs for the pour.',
        words: '',
      },
    ]);
  });

  it('stays theirs when they have become a caster', async () => {
    const before = await record(apprentice.user.id);
    await owner.client
      .patch(`/api/people/${apprentice.user.id}`)
      .send({ roles: ['caster'] })
      .expect(200);
    expect(await record(apprentice.user.id)).toEqual(before);
  });

  it('holds nothing of a caster, whose departures may be signed as well', async () => {
    const caster = await server.terminalAs('caster');
    const signer = await buildUser(server.services);
    const theirs = await driveCard(server, caster.client, (await buildCasting(server.services)).id);
    await leadToFlaskOut(theirs);
    const { context } = await theirs.melt();
    await theirs.write({ type: 'flask-out', furnaceC: context.figures.flaskHoldC + 40 });
    const by = await theirs.sign(signer.id);
    const reason = { index: 0, reason: 'other', words: 'Ran hot.', hold: false, by } as const;
    await theirs.write({ type: 'variance-explained', ...reason });
    expect(await record(caster.user.id)).toEqual([]);
    expect(await record(signer.id)).toEqual([]);
  });

  it('is written as CSV that no spreadsheet runs', async () => {
    const response = await owner.client.get(`/api/people/${apprentice.user.id}/supervised.csv`).expect(200);
    expect(response.headers).toMatchObject({
      'content-type': 'text/csv; charset=utf-8',
      'content-disposition': `attachment; filename="supervised-${apprentice.user.id}.csv"`,
    });
    expect(response.text).toContain(`"'=Signer ""one""",the server`);
    expect(response.text.split('\r\n')).toHaveLength(6);
  });

  it('is nobody’s where there is nobody', async () => {
    for (const path of ['supervised', 'supervised.csv'])
      expect(problemIdOf(await owner.client.get(`/api/people/${randomUUID()}/${path}`))).toBe('not-found');
  });
});

describe('the melt at the desk', () => {
  it('says what is held and what still wants a reason, and names its steps', async () => {
    const read = async (): Promise<Melt> =>
      (await owner.client.get(`/api/melts/${card.meltId}`).expect(200)).body as Melt;
    const melt = await read();
    expect(melt).toMatchObject({ departures: 1, openVariances: 0, holdsPieces: true, stop: null });
    expect(melt.steps.map(({ key }) => key)).toContain('apprentice-pour');
    await card.write({ type: 'stopped', reason: 'equipment' });
    expect(await read()).toMatchObject({
      departures: 2,
      openVariances: 1,
      stop: { sentence: 'Work was stopped because of equipment.', at: START },
    });
  });
});
