import { anyone } from '../policies/policy.ts';
import { readHealth } from '../queries/read-health.ts';
import { defineRoute } from './define-route.ts';

const health = defineRoute({
  method: 'get',
  path: '/api/health',
  policy: anyone,
  act: async ({ services, http }) => {
    const state = await readHealth(services);
    http.response.status(state.ready ? 200 : 503).json(state);
  },
});

export const healthRoutes = [health];
