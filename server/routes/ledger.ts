import { correctMovementRequest, listMovementsQuery, movementParams } from '#shared/contracts/ledger.ts';
import { correctMovement } from '../commands/correct-movement.ts';
import { ledgerPolicy } from '../policies/ledger.ts';
import { presentMovement } from '../presenters/movement.ts';
import { listMovements, loadMovement } from '../queries/list-movements.ts';
import { defineRoute } from './define-route.ts';
import { requirePerson } from './require-actor.ts';

const list = defineRoute({
  method: 'get',
  path: '/api/metal/movements',
  policy: ledgerPolicy.list,
  query: listMovementsQuery,
  act: async ({ actor, services, query }) => {
    const { movements, next } = await listMovements(services, query);
    return { movements: movements.map((movement) => presentMovement(movement, actor)), next };
  },
});

const correct = defineRoute({
  method: 'post',
  path: '/api/metal/movements/:id/corrections',
  policy: ledgerPolicy.correct,
  params: movementParams,
  body: correctMovementRequest,
  load: (services, params) => loadMovement(services, params.id),
  status: 201,
  act: async ({ actor, services, params, body }) => {
    await correctMovement(services, requirePerson(actor), params.id, body);
    return presentMovement(await loadMovement(services, params.id), actor);
  },
});

export const ledgerRoutes = [list, correct];
