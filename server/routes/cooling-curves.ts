import { idParams } from '#shared/contracts/common.ts';
import { recordCurveRequest } from '#shared/contracts/cooling-curve.ts';
import { recordCurve } from '../commands/record-curve.ts';
import { notFound } from '../errors.ts';
import type { Actor } from '../policies/actor.ts';
import { coolingPolicy } from '../policies/instrument.ts';
import { can } from '../policies/policy.ts';
import { presentCoolingCurve } from '../presenters/cooling-curve.ts';
import { listCoolingCurves } from '../queries/list-cooling-curves.ts';
import type { Services } from '../services/services.ts';
import { defineRoute } from './define-route.ts';
import { requirePerson } from './require-actor.ts';

const loadMeltRow = async ({ models }: Services, { id }: { readonly id: string }): Promise<undefined> => {
  if (!(await models.Melt.findByPk(id))) throw notFound('melt');
};

const present = async (services: Services, actor: Actor, meltId: string) => ({
  curves: (await listCoolingCurves(services, meltId)).map(presentCoolingCurve),
  abilities: { record: can(coolingPolicy.record, actor, undefined) },
});

const list = defineRoute({
  method: 'get',
  path: '/api/melts/:id/cooling-curves',
  policy: coolingPolicy.read,
  params: idParams,
  load: loadMeltRow,
  act: ({ actor, services, params }) => present(services, actor, params.id),
});

const record = defineRoute({
  method: 'post',
  path: '/api/melts/:id/cooling-curves',
  policy: coolingPolicy.record,
  params: idParams,
  load: loadMeltRow,
  body: recordCurveRequest,
  status: 201,
  act: async ({ actor, services, params, body }) => {
    await recordCurve(services, requirePerson(actor), params.id, body);
    return present(services, actor, params.id);
  },
});

export const coolingCurveRoutes = [list, record];
