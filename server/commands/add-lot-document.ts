import { typeOfContent } from '#shared/domain/metal/document-type.ts';
import { fieldError } from '../errors.ts';
import type { LotDocument } from '../models/lot-document.ts';
import type { SignedIn } from '../policies/actor.ts';
import type { Services } from '../services/services.ts';

/** Keeps a certificate or photograph of a lot; what it is is told by its content, never by its name. */
export const addLotDocument = async (
  { files, models, sequelize, now }: Services,
  { person }: SignedIn,
  lotId: string,
  { name, content }: { readonly name: string; readonly content: Buffer },
): Promise<LotDocument> => {
  const mediaType = typeOfContent(content);
  if (!mediaType)
    throw fieldError('file', 'That is not a PDF, JPEG, PNG or WebP file, whatever its name says.');
  const sha256 = await files.keep(content);
  return sequelize.transaction(() =>
    models.LotDocument.create({
      lotId,
      name,
      mediaType,
      sha256,
      bytes: content.length,
      userId: person.id,
      createdAt: now(),
    }),
  );
};
