import { idParams } from '#shared/contracts/common.ts';
import {
  amendLotRequest,
  countLotRequest,
  dispatchLotRequest,
  findLotQuery,
  listLotsQuery,
  receiveLotRequest,
  releaseLotRequest,
} from '#shared/contracts/lot.ts';
import { amendLot, releaseLot } from '../commands/amend-lot.ts';
import { countLot } from '../commands/count-lot.ts';
import { dispatchLot } from '../commands/dispatch-lot.ts';
import { receiveLot } from '../commands/receive-lot.ts';
import type { Actor } from '../policies/actor.ts';
import { lotPolicy } from '../policies/lot.ts';
import { presentLot, presentLotDetail } from '../presenters/lot.ts';
import { findLot, listLots, loadLot, loadLotWithHistory } from '../queries/load-lot.ts';
import type { Services } from '../services/services.ts';
import { defineRoute } from './define-route.ts';
import { requirePerson } from './require-actor.ts';

const detail = async (services: Services, id: string, actor: Actor) =>
  presentLotDetail(await loadLotWithHistory(services, id), actor);

const list = defineRoute({
  method: 'get',
  path: '/api/lots',
  policy: lotPolicy.list,
  query: listLotsQuery,
  act: async ({ actor, services, query }) =>
    (await listLots(services, query)).map((lot) => presentLot(lot, actor)),
});

const find = defineRoute({
  method: 'get',
  path: '/api/lots/by-code',
  policy: lotPolicy.read,
  query: findLotQuery,
  act: async ({ actor, services, query }) => presentLot(await findLot(services, query.code), actor),
});

const read = defineRoute({
  method: 'get',
  path: '/api/lots/:id',
  policy: lotPolicy.read,
  params: idParams,
  act: ({ actor, services, params }) => detail(services, params.id, actor),
});

const receive = defineRoute({
  method: 'post',
  path: '/api/lots',
  policy: lotPolicy.receive,
  body: receiveLotRequest,
  status: 201,
  act: async ({ actor, services, body }) => {
    const lot = await receiveLot(services, requirePerson(actor), body);
    return presentLot(await loadLot(services, lot.id), actor);
  },
});

const amend = defineRoute({
  method: 'post',
  path: '/api/lots/:id/amendments',
  policy: lotPolicy.amend,
  params: idParams,
  body: amendLotRequest,
  status: 201,
  act: async ({ actor, services, params, body }) => {
    await amendLot(services, requirePerson(actor), params.id, body);
    return detail(services, params.id, actor);
  },
});

const release = defineRoute({
  method: 'post',
  path: '/api/lots/:id/release',
  policy: lotPolicy.release,
  params: idParams,
  body: releaseLotRequest,
  load: (services, params) => loadLot(services, params.id),
  act: async ({ actor, services, subject, body }) => {
    await releaseLot(services, requirePerson(actor), subject.id, body.reason);
    return detail(services, subject.id, actor);
  },
});

const count = defineRoute({
  method: 'post',
  path: '/api/lots/:id/counts',
  policy: lotPolicy.count,
  params: idParams,
  body: countLotRequest,
  status: 201,
  act: async ({ actor, services, params, body }) => {
    await countLot(services, requirePerson(actor), params.id, body);
    return detail(services, params.id, actor);
  },
});

const dispatch = defineRoute({
  method: 'post',
  path: '/api/lots/:id/dispatches',
  policy: lotPolicy.dispatch,
  params: idParams,
  body: dispatchLotRequest,
  load: (services, params) => loadLot(services, params.id),
  status: 201,
  act: async ({ actor, services, subject, body }) => {
    await dispatchLot(services, requirePerson(actor), subject.id, body);
    return detail(services, subject.id, actor);
  },
});

export const lotRoutes = [list, find, read, receive, amend, release, count, dispatch];
