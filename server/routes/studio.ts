import { updateStudioRequest } from '#shared/contracts/studio.ts';
import { updateStudio } from '../commands/update-studio.ts';
import { studioPolicy } from '../policies/studio.ts';
import { presentStudio } from '../presenters/studio.ts';
import { loadStudio } from '../queries/load-studio.ts';
import { defineRoute } from './define-route.ts';

const read = defineRoute({
  method: 'get',
  path: '/api/studio',
  policy: studioPolicy.read,
  act: async ({ actor, services }) => presentStudio(await loadStudio(services), actor),
});

const update = defineRoute({
  method: 'patch',
  path: '/api/studio',
  policy: studioPolicy.update,
  body: updateStudioRequest,
  act: async ({ actor, services, body }) => presentStudio(await updateStudio(services, body), actor),
});

export const studioRoutes = [read, update];
