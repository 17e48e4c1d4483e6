import { flaskPolicy } from '../policies/flask.ts';
import { presentFlask } from '../presenters/flask.ts';
import { listFlasks } from '../queries/list-flasks.ts';
import { defineRoute } from './define-route.ts';

const list = defineRoute({
  method: 'get',
  path: '/api/flasks',
  policy: flaskPolicy.list,
  act: async ({ services }) => (await listFlasks(services)).map(presentFlask),
});

export const flaskRoutes = [list];
