import { createAlloyRequest, createRevisionRequest } from '#shared/contracts/alloy.ts';
import { idParams } from '#shared/contracts/common.ts';
import { approveRevision } from '../commands/approve-revision.ts';
import { checkRevision } from '../commands/check-revision.ts';
import { createAlloy } from '../commands/create-alloy.ts';
import { createRevision } from '../commands/create-revision.ts';
import { alloyPolicy, alloyRevisionPolicy } from '../policies/alloy.ts';
import type { Actor } from '../policies/actor.ts';
import { presentAlloy } from '../presenters/alloy.ts';
import { listAlloys, loadAlloy, loadRevision } from '../queries/load-alloy.ts';
import type { Services } from '../services/services.ts';
import { defineRoute } from './define-route.ts';
import { requirePerson } from './require-actor.ts';

const presentById = async (services: Services, id: string, actor: Actor) =>
  presentAlloy(await loadAlloy(services, id), actor);

const list = defineRoute({
  method: 'get',
  path: '/api/alloys',
  policy: alloyPolicy.list,
  act: async ({ actor, services }) => (await listAlloys(services)).map((alloy) => presentAlloy(alloy, actor)),
});

const read = defineRoute({
  method: 'get',
  path: '/api/alloys/:id',
  policy: alloyPolicy.read,
  params: idParams,
  act: ({ actor, services, params }) => presentById(services, params.id, actor),
});

const create = defineRoute({
  method: 'post',
  path: '/api/alloys',
  policy: alloyPolicy.create,
  body: createAlloyRequest,
  status: 201,
  act: async ({ actor, services, body }) => {
    const alloy = await createAlloy(services, requirePerson(actor), body);
    return presentById(services, alloy.id, actor);
  },
});

const revise = defineRoute({
  method: 'post',
  path: '/api/alloys/:id/revisions',
  policy: alloyPolicy.revise,
  params: idParams,
  body: createRevisionRequest,
  status: 201,
  act: async ({ actor, services, params, body }) => {
    const alloy = await loadAlloy(services, params.id);
    await createRevision(services, requirePerson(actor), alloy, body);
    return presentById(services, alloy.id, actor);
  },
});

const check = defineRoute({
  method: 'post',
  path: '/api/alloy-revisions/:id/check',
  policy: alloyRevisionPolicy.check,
  params: idParams,
  load: (services, params) => loadRevision(services, params.id),
  act: async ({ actor, services, subject }) => {
    await checkRevision(services, requirePerson(actor), subject);
    return presentById(services, subject.alloyId, actor);
  },
});

const approve = defineRoute({
  method: 'post',
  path: '/api/alloy-revisions/:id/approve',
  policy: alloyRevisionPolicy.approve,
  params: idParams,
  load: (services, params) => loadRevision(services, params.id),
  act: async ({ actor, services, subject }) => {
    await approveRevision(services, requirePerson(actor), subject);
    return presentById(services, subject.alloyId, actor);
  },
});

export const alloyRoutes = [list, read, create, revise, check, approve];
