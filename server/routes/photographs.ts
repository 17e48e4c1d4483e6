import { z } from 'zod';
import { addPhotographQuery } from '#shared/contracts/card.ts';
import { idParams } from '#shared/contracts/common.ts';
import { addPhotograph } from '../commands/add-photograph.ts';
import { notFound } from '../errors.ts';
import { readUpload } from '../middlewares/read-upload.ts';
import { sendFile } from '../middlewares/send-file.ts';
import { meltPolicy } from '../policies/melt.ts';
import { presentPhotograph } from '../presenters/photograph.ts';
import { loadMelt } from '../queries/load-melt.ts';
import { defineRoute } from './define-route.ts';
import { requireAtTerminal } from './require-actor.ts';

const photographParams = idParams.extend({ photographId: z.uuid('That is not a record of ours.') });

const add = defineRoute({
  method: 'post',
  path: '/api/melts/:id/photographs',
  policy: meltPolicy.addPhotograph,
  params: idParams,
  query: addPhotographQuery,
  load: (services, params) => loadMelt(services, params.id),
  status: 201,
  act: async ({ actor, services, subject, query, http }) => {
    const content = await readUpload(http);
    const at = requireAtTerminal(actor);
    return presentPhotograph(await addPhotograph(services, at, subject, { id: query.id, content }));
  },
});

const read = defineRoute({
  method: 'get',
  path: '/api/melts/:id/photographs/:photographId',
  policy: meltPolicy.readPhotograph,
  params: photographParams,
  act: async ({ services, params, http }) => {
    const photograph = await services.models.Photograph.findOne({
      where: { id: params.photographId, meltId: params.id },
    });
    if (!photograph) throw notFound('photograph');
    const file = { ...photograph.get(), name: `photograph-${photograph.id}` };
    await sendFile(http, await services.files.open(photograph.sha256), file);
  },
});

export const photographRoutes = [add, read];
