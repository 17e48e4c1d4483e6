import {
  changePotRequest,
  closeOutRequest,
  findPlanQuery,
  planChargeRequest,
  savePlanRequest,
} from '#shared/contracts/charge.ts';
import { idParams } from '#shared/contracts/common.ts';
import { closeOutMelt } from '../commands/close-out-melt.ts';
import { saveChargePlan } from '../commands/save-charge-plan.ts';
import { chargePolicy } from '../policies/charge.ts';
import {
  presentChargePlan,
  presentCrucible,
  presentOutcome,
  presentProposal,
  presentRunningCharge,
} from '../presenters/charge.ts';
import { presentMelt } from '../presenters/melt.ts';
import { listCrucibles } from '../queries/list-crucibles.ts';
import { loadChargePlan } from '../queries/load-charge-plan.ts';
import { loadMelt } from '../queries/load-melt.ts';
import { loadRunningCharge } from '../queries/load-running-charge.ts';
import { proposeCharges, proposePotChange } from '../queries/propose-charges.ts';
import { defineRoute } from './define-route.ts';
import { requirePerson } from './require-actor.ts';

const propose = defineRoute({
  method: 'post',
  path: '/api/charge-plans/proposals',
  policy: chargePolicy.plan,
  body: planChargeRequest,
  act: async ({ services, body }) => (await proposeCharges(services, body)).map(presentProposal),
});

const changePot = defineRoute({
  method: 'post',
  path: '/api/charge-plans/pot',
  policy: chargePolicy.plan,
  body: changePotRequest,
  act: async ({ services, body }) => presentOutcome(await proposePotChange(services, body)),
});

const save = defineRoute({
  method: 'post',
  path: '/api/charge-plans',
  policy: chargePolicy.save,
  body: savePlanRequest,
  status: 201,
  act: async ({ actor, services, body }) => {
    await saveChargePlan(services, requirePerson(actor), body);
    const plan = await loadChargePlan(services, body.castingIds[0] ?? '');
    return plan && presentChargePlan(plan, actor);
  },
});

const find = defineRoute({
  method: 'get',
  path: '/api/charge-plans',
  policy: chargePolicy.read,
  query: findPlanQuery,
  act: async ({ actor, services, query }) => {
    const plan = await loadChargePlan(services, query.castingId);
    return plan && presentChargePlan(plan, actor);
  },
});

const running = defineRoute({
  method: 'get',
  path: '/api/melts/:id/charge',
  policy: chargePolicy.read,
  params: idParams,
  act: async ({ services, params }) =>
    presentRunningCharge(await loadRunningCharge(services, await loadMelt(services, params.id))),
});

const crucibles = defineRoute({
  method: 'get',
  path: '/api/metal/crucibles',
  policy: chargePolicy.closeOut,
  act: async ({ services }) => (await listCrucibles(services)).map(presentCrucible),
});

const closeOut = defineRoute({
  method: 'post',
  path: '/api/melts/:id/close-out',
  policy: chargePolicy.closeOut,
  params: idParams,
  body: closeOutRequest,
  act: async ({ actor, services, params, body }) => {
    await closeOutMelt(services, requirePerson(actor), await loadMelt(services, params.id), body);
    return presentMelt(await loadMelt(services, params.id), actor);
  },
});

export const chargeRoutes = [propose, changePot, save, find, running, crucibles, closeOut];
