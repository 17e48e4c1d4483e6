import { randomUUID } from 'node:crypto';
import { defaultInstruction } from '#shared/domain/instruction/default-instruction.ts';
import { defaultProcessTables } from '#shared/domain/studio/process-tables.ts';
import { defaultStudioLimits } from '#shared/domain/studio/studio-limits.ts';
import { buildAlloyRevision } from '#tests/factories/build-alloy-revision.ts';
import { buildCasting } from '#tests/factories/build-casting.ts';
import { buildMelt } from '#tests/factories/build-melt.ts';
import { buildUser } from '#tests/factories/build-user.ts';
import { buildInstrumentTargets } from './instrument-request-targets.ts';
import { buildInstructionDraft } from '#tests/factories/build-instruction-draft.ts';
import { buildMetalTargets } from './metal-request-targets.ts';
import { START, type Client, type TestServer } from './test-server.ts';

const quench = { earliestS: 900, latestS: null, medium: 'water', why: 'Let it set.', source: 'Test.' };
const revision = {
  compositionWt: { Ag: 92.5, Cu: 7.5 },
  toleranceWt: { Ag: 0.2 },
  fineness: 925,
  quench,
  measured: null,
  note: '',
};
const stamp = { key: randomUUID(), occurredAt: START };

/** Where a route is found, a client that gets in, and a request it would take. */
export interface RequestTarget {
  readonly path: string;
  readonly client: Client;
  readonly good: object;
}

/** For every route that reads a body, by method and path: somewhere to send one. */
export const buildRequestTargets = async (
  server: TestServer,
): Promise<Readonly<Record<string, RequestTarget>>> => {
  const { services } = server;
  const asking = await server.deskAs('owner');
  const owner = asking.client;
  const furnace = await server.terminalAs('caster');
  const terminal = furnace.client;
  const person = await buildUser(services);
  const casting = await buildCasting(services);
  const moving = await buildCasting(services, { state: 'invested' });
  const draft = await buildAlloyRevision(services, { status: 'draft' });
  const instruction = await buildInstructionDraft(services);
  // Of the one who asks, so that it stays a draft whatever is sent.
  const approvable = await buildInstructionDraft(services, { draftedBy: asking.user.id });
  const melt = await buildMelt(services, { user: furnace.user, terminal: furnace.terminal, step: 'charge' });
  const device = server.atTerminal(furnace.token);
  const studio = {
    version: 1,
    name: 'Studio',
    temperatureUnit: 'C',
    massUnit: 'g',
    timeZone: 'Europe/Lisbon',
    idleLockS: 180,
    processTables: defaultProcessTables,
    limits: defaultStudioLimits,
  };
  const newPerson = {
    name: 'Someone',
    login: person.login,
    email: null,
    roles: ['caster'],
    password: 'a long enough password',
    pin: '123456',
  };
  return {
    ...(await buildMetalTargets(server, owner)),
    ...(await buildInstrumentTargets(server, owner)),
    'post /api/session/desk': {
      path: '/api/session/desk',
      client: server.nobody(),
      good: { login: person.login, password: 'not the password' },
    },
    'post /api/session/terminal': {
      path: '/api/session/terminal',
      client: device,
      good: { personId: person.id, pin: '000000' },
    },
    'post /api/terminals/codes': {
      path: '/api/terminals/codes',
      client: owner,
      good: { name: 'Terminal', bay: 'bay 1' },
    },
    'post /api/terminals': {
      path: '/api/terminals',
      client: server.nobody('terminal'),
      good: { code: '12345678' },
    },
    'post /api/people': { path: '/api/people', client: owner, good: newPerson },
    'patch /api/people/:id': {
      path: `/api/people/${person.id}`,
      client: owner,
      good: { name: 'Someone', email: 'a@example.org', roles: ['caster'], active: true },
    },
    'post /api/instructions': {
      path: '/api/instructions',
      client: owner,
      good: { from: instruction.id },
    },
    'patch /api/instructions/:id': {
      path: `/api/instructions/${instruction.id}`,
      client: owner,
      good: { version: 1, content: defaultInstruction, note: 'A note.' },
    },
    'post /api/instructions/:id/drop': {
      path: `/api/instructions/${instruction.id}/drop`,
      client: owner,
      good: { version: 1 },
    },
    'post /api/instructions/:id/approve': {
      path: `/api/instructions/${approvable.id}/approve`,
      client: owner,
      good: { version: 1, exception: '' },
    },
    'patch /api/studio': { path: '/api/studio', client: owner, good: studio },
    'post /api/alloys': {
      path: '/api/alloys',
      client: owner,
      good: { ...revision, name: 'Alloy', family: 'silver' },
    },
    'post /api/alloys/:id/revisions': {
      path: `/api/alloys/${draft.alloyId}/revisions`,
      client: owner,
      good: revision,
    },
    'post /api/castings/:id/move': {
      path: `/api/castings/${moving.id}/move`,
      client: owner,
      good: { to: 'dewaxed', reason: '' },
    },
    'post /api/cards/:id/open': {
      path: `/api/cards/${casting.id}/open`,
      client: terminal,
      good: { ...stamp, carryOn: false },
    },
    'post /api/melts/:id/events': {
      path: `/api/melts/${melt.id}/events`,
      client: terminal,
      good: { ...stamp, event: { type: 'charge-weighed', kind: 'grain', massG: 1 } },
    },
    'post /api/melts/:id/countersigns': {
      path: `/api/melts/${melt.id}/countersigns`,
      client: terminal,
      good: { personId: person.id, pin: '000000' },
    },
    'post /api/melts/:id/photographs': {
      path: `/api/melts/${melt.id}/photographs?id=${randomUUID()}`,
      client: terminal,
      good: {},
    },
    'post /api/melts/:id/amendments': {
      path: `/api/melts/${melt.id}/amendments`,
      client: owner,
      good: { seq: 1, note: 'A remark.' },
    },
  };
};
