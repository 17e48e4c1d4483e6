import { countersignMeltRequest, recordEventRequest } from '#shared/contracts/card.ts';
import { idParams } from '#shared/contracts/common.ts';
import { amendMeltRequest, listMeltsQuery } from '#shared/contracts/melt.ts';
import { amendMelt } from '../commands/amend-melt.ts';
import { countersignMelt } from '../commands/countersign-melt.ts';
import { recordEvent } from '../commands/record-event.ts';
import { meltPolicy } from '../policies/melt.ts';
import { presentMeltEvent } from '../presenters/card.ts';
import { presentMelt, presentMeltSummary } from '../presenters/melt.ts';
import { listMelts } from '../queries/list-melts.ts';
import { loadEvent, loadMelt } from '../queries/load-melt.ts';
import { defineRoute } from './define-route.ts';
import { requireAtTerminal, requirePerson } from './require-actor.ts';

const list = defineRoute({
  method: 'get',
  path: '/api/melts',
  policy: meltPolicy.list,
  query: listMeltsQuery,
  act: async ({ services, query }) => {
    const { melts, next } = await listMelts(services, query);
    return { melts: melts.map(presentMeltSummary), next };
  },
});

const read = defineRoute({
  method: 'get',
  path: '/api/melts/:id',
  policy: meltPolicy.read,
  params: idParams,
  act: async ({ actor, services, params }) => presentMelt(await loadMelt(services, params.id), actor),
});

const record = defineRoute({
  method: 'post',
  path: '/api/melts/:id/events',
  policy: meltPolicy.deliver,
  params: idParams,
  body: recordEventRequest,
  status: 201,
  act: async ({ actor, services, params, body }) => {
    const event = await recordEvent(services, requireAtTerminal(actor), params.id, body);
    return presentMeltEvent(await loadEvent(services, event.id));
  },
});

const countersign = defineRoute({
  method: 'post',
  path: '/api/melts/:id/countersigns',
  policy: meltPolicy.countersign,
  params: idParams,
  body: countersignMeltRequest,
  load: (services, params) => loadMelt(services, params.id),
  status: 201,
  act: ({ actor, services, subject, body }) =>
    countersignMelt(services, requireAtTerminal(actor), subject, body),
});

const amend = defineRoute({
  method: 'post',
  path: '/api/melts/:id/amendments',
  policy: meltPolicy.amend,
  params: idParams,
  body: amendMeltRequest,
  status: 201,
  act: async ({ actor, services, params, body }) => {
    const melt = await loadMelt(services, params.id);
    await amendMelt(services, requirePerson(actor), melt, body);
    return presentMelt(await loadMelt(services, melt.id), actor);
  },
});

export const meltRoutes = [list, read, record, countersign, amend];
