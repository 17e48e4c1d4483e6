import { findCardQuery, openCardRequest } from '#shared/contracts/card.ts';
import { idParams } from '#shared/contracts/common.ts';
import { openCard } from '../commands/open-card.ts';
import type { Actor } from '../policies/actor.ts';
import { cardPolicy, castingPolicy } from '../policies/casting.ts';
import { presentCard } from '../presenters/card.ts';
import { findCard } from '../queries/find-card.ts';
import { loadCard } from '../queries/load-card.ts';
import { loadCasting, type LoadedCasting } from '../queries/load-casting.ts';
import type { Services } from '../services/services.ts';
import { defineRoute } from './define-route.ts';
import { requireAtTerminal } from './require-actor.ts';

const present = async (services: Services, casting: LoadedCasting, actor: Actor) =>
  presentCard(await loadCard(services, casting), actor, services.now());

const find = defineRoute({
  method: 'get',
  path: '/api/cards',
  policy: cardPolicy.find,
  query: findCardQuery,
  act: async ({ actor, services, query }) => present(services, await findCard(services, query.code), actor),
});

const read = defineRoute({
  method: 'get',
  path: '/api/cards/:id',
  policy: cardPolicy.find,
  params: idParams,
  act: async ({ actor, services, params }) =>
    present(services, await loadCasting(services, params.id), actor),
});

const open = defineRoute({
  method: 'post',
  path: '/api/cards/:id/open',
  policy: castingPolicy.openCard,
  params: idParams,
  body: openCardRequest,
  load: (services, params) => loadCasting(services, params.id),
  act: async ({ actor, services, subject, body }) => {
    await openCard(services, requireAtTerminal(actor), subject.id, body);
    return present(services, await loadCasting(services, subject.id), actor);
  },
});

export const cardRoutes = [find, read, open];
