import { listCastingsQuery, moveCastingRequest } from '#shared/contracts/casting.ts';
import { idParams } from '#shared/contracts/common.ts';
import { moveCasting } from '../commands/move-casting.ts';
import { castingPolicy } from '../policies/casting.ts';
import { presentCasting } from '../presenters/casting.ts';
import { listCastings } from '../queries/list-castings.ts';
import { loadCasting } from '../queries/load-casting.ts';
import { defineRoute } from './define-route.ts';
import { requirePerson } from './require-actor.ts';

const list = defineRoute({
  method: 'get',
  path: '/api/castings',
  policy: castingPolicy.list,
  query: listCastingsQuery,
  act: async ({ actor, services, query }) =>
    (await listCastings(services, query)).map((casting) => presentCasting(casting, actor)),
});

const move = defineRoute({
  method: 'post',
  path: '/api/castings/:id/move',
  policy: castingPolicy.move,
  params: idParams,
  body: moveCastingRequest,
  load: (services, params) => loadCasting(services, params.id),
  act: async ({ actor, services, subject, body }) => {
    await moveCasting(services, requirePerson(actor), subject, body);
    return presentCasting(await loadCasting(services, subject.id), actor);
  },
});

export const castingRoutes = [list, move];
