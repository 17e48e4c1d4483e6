import { logFlaskRequest } from '#shared/contracts/flask-cooling.ts';
import { logFlask } from '../commands/log-flask.ts';
import { coolingPolicy } from '../policies/instrument.ts';
import { presentFlaskCooling } from '../presenters/flask-cooling.ts';
import { loadOutingsBySize } from '../queries/load-flask-cooling.ts';
import { loadStudio } from '../queries/load-studio.ts';
import type { Services } from '../services/services.ts';
import { defineRoute } from './define-route.ts';
import { requirePerson } from './require-actor.ts';

const present = async (services: Services) => {
  const { processTables } = await loadStudio(services);
  return presentFlaskCooling(processTables.flaskCooling, await loadOutingsBySize(services));
};

const read = defineRoute({
  method: 'get',
  path: '/api/flask-cooling',
  policy: coolingPolicy.read,
  act: ({ services }) => present(services),
});

const log = defineRoute({
  method: 'post',
  path: '/api/flask-cooling',
  policy: coolingPolicy.record,
  body: logFlaskRequest,
  status: 201,
  act: async ({ actor, services, body }) => {
    await logFlask(services, requirePerson(actor), body);
    return present(services);
  },
});

export const flaskCoolingRoutes = [read, log];
