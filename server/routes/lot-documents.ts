import { z } from 'zod';
import { idParams } from '#shared/contracts/common.ts';
import { addDocumentQuery } from '#shared/contracts/lot.ts';
import { addLotDocument } from '../commands/add-lot-document.ts';
import { notFound } from '../errors.ts';
import { readUpload } from '../middlewares/read-upload.ts';
import { sendFile } from '../middlewares/send-file.ts';
import { lotPolicy } from '../policies/lot.ts';
import { presentLotDetail } from '../presenters/lot.ts';
import { loadLot, loadLotWithHistory } from '../queries/load-lot.ts';
import { defineRoute } from './define-route.ts';
import { requirePerson } from './require-actor.ts';

const documentParams = idParams.extend({ documentId: z.uuid('That is not a record of ours.') });

const add = defineRoute({
  method: 'post',
  path: '/api/lots/:id/documents',
  policy: lotPolicy.addDocument,
  params: idParams,
  query: addDocumentQuery,
  load: (services, params) => loadLot(services, params.id),
  status: 201,
  act: async ({ actor, services, subject, query, http }) => {
    const content = await readUpload(http);
    await addLotDocument(services, requirePerson(actor), subject.id, { name: query.name, content });
    return presentLotDetail(await loadLotWithHistory(services, subject.id), actor);
  },
});

const read = defineRoute({
  method: 'get',
  path: '/api/lots/:id/documents/:documentId',
  policy: lotPolicy.readDocument,
  params: documentParams,
  act: async ({ services, params, http }) => {
    const document = await services.models.LotDocument.findOne({
      where: { id: params.documentId, lotId: params.id },
    });
    if (!document) throw notFound('document');
    await sendFile(http, await services.files.open(document.sha256), document);
  },
});

export const lotDocumentRoutes = [add, read];
