import { afterAll, afterEach, beforeAll, describe, expect, it } from 'vitest';
import type { PourCard } from '#shared/contracts/card.ts';
import type { Instruction, InstructionList } from '#shared/contracts/instruction.ts';
import { defaultInstruction } from '#shared/domain/instruction/default-instruction.ts';
import type { InstructionStep } from '#shared/domain/instruction/instruction-step.ts';
import type { WorkInstruction } from '#shared/domain/instruction/work-instruction.ts';
import { cardSteps } from '#shared/domain/pour-card/card-step.ts';
import { guardOnly } from '#tests/factories/build-studio.ts';
import { buildCasting } from '#tests/factories/build-casting.ts';
import { buildInstructionDraft } from '#tests/factories/build-instruction-draft.ts';
import { openCard } from '#tests/support/ask-for-card.ts';
import { problemIdOf, sentenceOf } from '#tests/support/problem-id.ts';
import {
  startTestServer,
  type Client,
  type SignedInClient,
  type TestServer,
} from '#tests/support/test-server.ts';

let server: TestServer;
let owner: SignedInClient;
let caster: SignedInClient;
beforeAll(async () => {
  server = await startTestServer();
  owner = await server.deskAs('owner');
  caster = await server.deskAs('caster');
});
afterEach(() => server.expectNoSurprises());
afterAll(() => server.close());

const everywhere = { methods: [], families: [], roles: [], hazards: [] };
const aSay: InstructionStep = {
  kind: 'say',
  key: 'say-keys',
  before: 'charge',
  sentence: 'Keys to the safe.',
  when: everywhere,
  maySkip: true,
};

/** The default instruction with one more step, in its place. */
const withStep = (step: InstructionStep): WorkInstruction => {
  const { steps } = defaultInstruction;
  const place = cardSteps.indexOf(step.before);
  const index = steps.findLastIndex(({ before }) => cardSteps.indexOf(before) <= place) + 1;
  return { ...defaultInstruction, steps: steps.toSpliced(index, 0, step) };
};

const listed = async ({ client }: SignedInClient = owner): Promise<InstructionList> =>
  (await client.get('/api/instructions').expect(200)).body as InstructionList;

const inForce = async (): Promise<string> => {
  const found = (await listed()).revisions.find(({ isInForce }) => isInForce);
  if (!found) throw new Error('No work instruction is in force.');
  return found.id;
};

const draft = async ({ client }: SignedInClient = owner): Promise<Instruction> =>
  (
    await client
      .post('/api/instructions')
      .send({ from: await inForce() })
      .expect(201)
  ).body as Instruction;

const change = (client: Client, { id, version }: Instruction, content: object, note = '') =>
  client.patch(`/api/instructions/${id}`).send({ version, content, note });

const approve = (client: Client, { id, version }: Instruction, exception = '') =>
  client.post(`/api/instructions/${id}/approve`).send({ version, exception });

describe('a revision of the work instruction', () => {
  it('begins as another one stands, is changed, approved by a second person, and then is in force', async () => {
    const first = await inForce();
    const begun = await draft();
    expect(begun).toMatchObject({
      status: 'draft',
      draftedBy: owner.user.name,
      content: guardOnly,
      approval: 'own-draft',
      abilities: { draft: true, change: true, drop: true, approve: false },
    });
    const changed = (await change(owner.client, begun, withStep(aSay), 'Keys.').expect(200))
      .body as Instruction;
    expect(changed).toMatchObject({ version: 2, note: 'Keys.', content: withStep(aSay), faults: [] });
    const approved = (await approve(caster.client, changed).expect(200)).body as Instruction;
    expect(approved).toMatchObject({
      status: 'approved',
      isInForce: true,
      exception: '',
      approvedBy: caster.user.name,
      approvedAt: server.services.now().toISOString(),
    });
    expect((await listed()).revisions.map(({ id, isInForce }) => [id, isInForce])).toEqual([
      [approved.id, true],
      [first, false],
    ]);
  });

  it('leaves a running card what it began with, and is on the next one', async () => {
    const { client } = await server.terminalAs('caster');
    const running = await openCard(client, (await buildCasting(server.services)).id);
    const step = { ...aSay, key: 'say-door', sentence: 'Shut the door.' };
    const changed = (await change(owner.client, await draft(), withStep(step)).expect(200))
      .body as Instruction;
    const approved = (await approve(caster.client, changed).expect(200)).body as Instruction;
    const again = (await client.get(`/api/cards/${running.card.casting.id}`).expect(200)).body as PourCard;
    expect(again.instruction).toEqual(running.card.instruction);
    expect(again.context).toEqual(running.card.context);
    const { card } = await openCard(client, (await buildCasting(server.services)).id);
    expect(card.instruction.revision).toBe(approved.number);
    expect(card.context.rules?.steps).toContainEqual(step);
  });

  it('is read by everyone who is signed in, and changed by none of them', async () => {
    const { id } = await draft();
    for (const role of ['caster', 'jeweller', 'apprentice'] as const) {
      const { client } = await server.deskAs(role);
      expect((await listed({ client, user: owner.user })).abilities).toEqual({ draft: false });
      const read = (await client.get(`/api/instructions/${id}`).expect(200)).body as Instruction;
      expect(read.abilities).toEqual({
        draft: false,
        change: false,
        drop: false,
        approve: role === 'caster',
      });
      expect(problemIdOf(await change(client, read, defaultInstruction))).toBe('not-allowed');
    }
  });

  it('is dropped and stays in the list; after that nothing moves it', async () => {
    const begun = await draft();
    const dropped = await owner.client
      .post(`/api/instructions/${begun.id}/drop`)
      .send({ version: begun.version });
    expect(dropped.body).toMatchObject({ status: 'dropped', isInForce: false });
    expect((await listed()).revisions.map(({ id }) => id)).toContain(begun.id);
    expect(problemIdOf(await change(owner.client, begun, defaultInstruction))).toBe('not-allowed');
    expect(problemIdOf(await approve(caster.client, begun))).toBe('not-allowed');
  });

  it('is frozen in the database once it is approved', async () => {
    const { WorkInstructionRevision } = server.services.models;
    const revision = await WorkInstructionRevision.findByPk(await inForce(), { rejectOnEmpty: true });
    await expect(revision.update({ note: 'Another.' })).rejects.toThrow(/frozen/);
    await expect(revision.destroy()).rejects.toThrow(/never removed/);
  });
});

describe('two people at once', () => {
  it('take turns at drafting, each with a number of its own', async () => {
    const drafts = await Promise.all([draft(), draft(), draft()]);
    expect(new Set(drafts.map(({ number }) => number)).size).toBe(3);
  });

  it('never overwrite one another’s changes', async () => {
    const begun = await draft();
    const other = await server.deskAs('owner');
    const answers = await Promise.all([
      change(owner.client, begun, withStep(aSay), 'mine'),
      change(other.client, begun, withStep(aSay), 'theirs'),
    ]);
    expect(answers.map(({ status }) => status).sort()).toEqual([200, 409]);
    expect(problemIdOf(answers.find(({ status }) => status === 409) ?? answers[0])).toBe('changed-meanwhile');
  });

  it('approve it once, and only what they have read', async () => {
    const begun = await draft();
    const other = await server.deskAs('caster');
    const changed = (await change(owner.client, begun, withStep(aSay)).expect(200)).body as Instruction;
    expect(problemIdOf(await approve(caster.client, begun))).toBe('changed-meanwhile');
    const answers = await Promise.all([approve(caster.client, changed), approve(other.client, changed)]);
    expect(answers.filter(({ status }) => status === 200)).toHaveLength(1);
  });

  it('do not take back what was approved since a draft began', async () => {
    const [older, newer] = [await draft(), await draft()];
    await approve(caster.client, newer).expect(200);
    const refused = await approve(caster.client, older);
    expect(problemIdOf(refused)).toBe('changed-meanwhile');
    expect(sentenceOf(refused)).toMatch(`Revision ${newer.number} has been approved since`);
  });

  it('count as drafter whoever changed the draft last', async () => {
    const begun = await draft();
    const other = await server.deskAs('owner');
    const changed = (await change(other.client, begun, withStep(aSay)).expect(200)).body as Instruction;
    expect(problemIdOf(await approve(other.client, changed, 'I know it.'))).toBe('not-allowed');
    await approve(owner.client, changed).expect(200);
  });
});

describe('what may not be worked by', () => {
  const wait: InstructionStep = { ...aSay, kind: 'wait', key: 'wait-first', before: 'guard', seconds: 60 };
  const choose: InstructionStep = {
    ...aSay,
    kind: 'choose',
    key: 'choose-one',
    options: [{ words: 'Yes', isVariance: false }],
  };
  const misplaced: InstructionStep = { ...aSay, key: 'say-late', before: 'pour' };

  it.each([
    [wait, /nothing to wait for/],
    [choose, /two answers/],
    [misplaced, /between flask out and pour/],
  ])('is kept as a draft and not approved, with the fault at its step: $key', async (step, sentence) => {
    const content = withStep(step);
    const kept = (await change(owner.client, await draft(), content).expect(200)).body as Instruction;
    expect(kept.faults).toMatchObject([{ stepKey: step.key }]);
    const refused = await approve(caster.client, kept);
    expect(problemIdOf(refused)).toBe('invalid-request');
    const index = content.steps.findIndex(({ key }) => key === step.key);
    expect(refused.body).toMatchObject({ fields: [{ path: `content.steps.${index}` }] });
    expect(sentenceOf(refused)).toMatch(sentence);
  });

  it('has no guard that everyone sees', async () => {
    const content = {
      ...defaultInstruction,
      steps: defaultInstruction.steps.filter(({ before }) => before !== 'guard'),
    };
    const kept = (await change(owner.client, await draft(), content).expect(200)).body as Instruction;
    expect((await approve(caster.client, kept)).body).toMatchObject({ fields: [{ path: 'content.steps' }] });
  });

  const many = Array.from({ length: 61 }, (_, index) => ({ ...aSay, key: `say-${index}` }));
  const read = { ...aSay, kind: 'read', limitsC: { low: 5000, high: null } };
  it.each([
    ['no title', { ...defaultInstruction, title: ' ' }, 'content.title'],
    ['a sentence of 300 characters', withStep({ ...aSay, sentence: 'a'.repeat(300) }), 'sentence'],
    ['no sentence of a part', { ...defaultInstruction, sentences: { guard: 'Check.' } }, 'content.sentences'],
    ['61 steps', { ...defaultInstruction, steps: many }, 'content.steps'],
    ['one mark twice', { ...defaultInstruction, steps: [aSay, aSay] }, 'content.steps.1.key'],
    ['an unknown kind', { ...defaultInstruction, steps: [{ ...aSay, kind: 'dance' }] }, 'content.steps.0'],
    ['an unknown part', { ...defaultInstruction, steps: [{ ...aSay, before: 'lunch' }] }, 'content.steps.0'],
    ['5000 °C', { ...defaultInstruction, steps: [read] }, 'content.steps.0.limitsC.low'],
    ['no content', null, 'content'],
  ])('is refused at once with %s', async (_what, content, path) => {
    const response = await change(owner.client, await draft(), content as object);
    expect(problemIdOf(response)).toBe('invalid-request');
    const { fields } = response.body as { fields: { path: string }[] };
    expect(fields.some((field) => field.path.includes(path))).toBe(true);
  });
});

describe('a studio of one', () => {
  let alone: TestServer;
  let only: SignedInClient;
  beforeAll(async () => {
    alone = await startTestServer();
    only = await alone.deskAs('owner');
  });
  afterAll(() => alone.close());

  it('approves its own draft with an exception in words, and not without', async () => {
    const { id } = await buildInstructionDraft(alone.services, { draftedBy: only.user.id });
    const read = (await only.client.get(`/api/instructions/${id}`).expect(200)).body as Instruction;
    expect(read).toMatchObject({ approval: 'exception', abilities: { approve: true } });
    const refused = await approve(only.client, read, '  ');
    expect(refused.body).toMatchObject({ fields: [{ path: 'exception' }] });
    const approved = await approve(only.client, read, 'I work alone until March.').expect(200);
    expect(approved.body).toMatchObject({ exception: 'I work alone until March.', isInForce: true });
  });

  it('needs a second person again as soon as there is one', async () => {
    const { id } = await buildInstructionDraft(alone.services, { draftedBy: only.user.id });
    await alone.deskAs('caster');
    const read = (await only.client.get(`/api/instructions/${id}`).expect(200)).body as Instruction;
    expect(read).toMatchObject({ approval: 'own-draft', abilities: { approve: false } });
    expect(problemIdOf(await approve(only.client, read, 'I know it.'))).toBe('not-allowed');
    alone.expectNoSurprises();
  });
});
