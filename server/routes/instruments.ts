import { idParams } from '#shared/contracts/common.ts';
import { createInstrumentRequest, recordCheckRequest } from '#shared/contracts/instrument.ts';
import { createInstrument } from '../commands/create-instrument.ts';
import { recordCheck } from '../commands/record-check.ts';
import { revokeInstrument } from '../commands/revoke-instrument.ts';
import type { Actor } from '../policies/actor.ts';
import { instrumentPolicy } from '../policies/instrument.ts';
import { presentCheck, presentInstrument, presentReading } from '../presenters/instrument.ts';
import {
  listChecks,
  listInstruments,
  loadInstrument,
  loadInstrumentWithState,
  loadLatestReading,
} from '../queries/load-instrument.ts';
import type { Services } from '../services/services.ts';
import { defineRoute } from './define-route.ts';
import { requirePerson } from './require-actor.ts';

const presentOne = async (services: Services, actor: Actor, id: string) =>
  presentInstrument(await loadInstrumentWithState(services, id), actor, services.now());

const list = defineRoute({
  method: 'get',
  path: '/api/instruments',
  policy: instrumentPolicy.list,
  act: async ({ actor, services }) =>
    (await listInstruments(services)).map((each) => presentInstrument(each, actor, services.now())),
});

const create = defineRoute({
  method: 'post',
  path: '/api/instruments',
  policy: instrumentPolicy.create,
  body: createInstrumentRequest,
  status: 201,
  act: async ({ actor, services, body }) => {
    const { instrument, token } = await createInstrument(services, requirePerson(actor), body);
    return { instrument: await presentOne(services, actor, instrument.id), token };
  },
});

const revoke = defineRoute({
  method: 'post',
  path: '/api/instruments/:id/revoke',
  policy: instrumentPolicy.revoke,
  params: idParams,
  load: (services, params) => loadInstrument(services, params.id),
  act: async ({ actor, services, subject }) => {
    await revokeInstrument(services, subject);
    return presentOne(services, actor, subject.id);
  },
});

const latest = defineRoute({
  method: 'get',
  path: '/api/instruments/:id/latest',
  policy: instrumentPolicy.read,
  params: idParams,
  load: (services, params) => loadInstrument(services, params.id),
  act: async ({ services, subject }) => {
    const reading = await loadLatestReading(services, subject.id);
    return { reading: reading && presentReading(reading, services.now()) };
  },
});

const checks = defineRoute({
  method: 'get',
  path: '/api/instruments/:id/checks',
  policy: instrumentPolicy.read,
  params: idParams,
  load: (services, params) => loadInstrument(services, params.id),
  act: async ({ services, subject }) => (await listChecks(services, subject.id)).map(presentCheck),
});

const check = defineRoute({
  method: 'post',
  path: '/api/instruments/:id/checks',
  policy: instrumentPolicy.check,
  params: idParams,
  body: recordCheckRequest,
  load: (services, params) => loadInstrument(services, params.id),
  status: 201,
  act: async ({ actor, services, subject, body }) => {
    await recordCheck(services, requirePerson(actor), subject, body);
    return presentOne(services, actor, subject.id);
  },
});

export const instrumentRoutes = [list, create, revoke, latest, checks, check];
