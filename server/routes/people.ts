import { createPersonRequest, updatePersonRequest } from '#shared/contracts/person.ts';
import { idParams } from '#shared/contracts/common.ts';
import { createPerson } from '../commands/create-person.ts';
import { unlockPerson } from '../commands/unlock-person.ts';
import { updatePerson } from '../commands/update-person.ts';
import { sendDownload } from '../middlewares/send-download.ts';
import { personPolicy } from '../policies/person.ts';
import { presentPerson, presentPersonAtTerminal } from '../presenters/person.ts';
import { listSupervised } from '../queries/list-supervised.ts';
import { listPeople, listPeopleAtTerminal, loadPerson } from '../queries/load-person.ts';
import { supervisedCsv } from '../services/reports/supervised-csv.ts';
import { defineRoute } from './define-route.ts';

const list = defineRoute({
  method: 'get',
  path: '/api/people',
  policy: personPolicy.list,
  act: async ({ actor, services }) => (await listPeople(services)).map((user) => presentPerson(user, actor)),
});

const listAtTerminal = defineRoute({
  method: 'get',
  path: '/api/terminal/people',
  policy: personPolicy.listAtTerminal,
  act: async ({ services }) => (await listPeopleAtTerminal(services)).map(presentPersonAtTerminal),
});

const create = defineRoute({
  method: 'post',
  path: '/api/people',
  policy: personPolicy.create,
  body: createPersonRequest,
  status: 201,
  act: async ({ actor, services, body }) => presentPerson(await createPerson(services, body), actor),
});

const update = defineRoute({
  method: 'patch',
  path: '/api/people/:id',
  policy: personPolicy.update,
  params: idParams,
  body: updatePersonRequest,
  act: async ({ actor, services, params, body, http }) =>
    presentPerson(await updatePerson(services, params.id, body, http.request.sessionID), actor),
});

const unlock = defineRoute({
  method: 'post',
  path: '/api/people/:id/unlock',
  policy: personPolicy.unlock,
  params: idParams,
  act: async ({ actor, services, params }) =>
    presentPerson(await unlockPerson(services, await loadPerson(services, params.id)), actor),
});

const supervised = defineRoute({
  method: 'get',
  path: '/api/people/:id/supervised',
  policy: personPolicy.readSupervised,
  params: idParams,
  act: async ({ services, params }) => listSupervised(services, (await loadPerson(services, params.id)).id),
});

const supervisedAsCsv = defineRoute({
  method: 'get',
  path: '/api/people/:id/supervised.csv',
  policy: personPolicy.readSupervised,
  params: idParams,
  act: async ({ services, params, http }) => {
    const { id, name } = await loadPerson(services, params.id);
    const csv = supervisedCsv(name, await listSupervised(services, id));
    sendDownload(http, 'text/csv; charset=utf-8', `supervised-${id}.csv`, csv);
  },
});

export const peopleRoutes = [list, listAtTerminal, create, update, unlock, supervised, supervisedAsCsv];
