import { typeOfContent } from '#shared/domain/metal/document-type.ts';
import { AppError, fieldError } from '../errors.ts';
import type { Melt } from '../models/melt.ts';
import type { Photograph } from '../models/photograph.ts';
import type { AtTerminal } from '../policies/actor.ts';
import type { Services } from '../services/services.ts';

/** A photograph with whose it is. */
export interface KeptPhotograph {
  readonly photograph: Photograph;
  readonly person: string;
}

/** Keeps a photograph of a melt, once however often it is sent; what it is is told by its content. */
export const addPhotograph = async (
  { files, models, sequelize, now }: Services,
  { person, terminal }: AtTerminal,
  melt: Melt,
  { id, content }: { readonly id: string; readonly content: Buffer },
): Promise<KeptPhotograph> => {
  const mediaType = typeOfContent(content);
  if (!mediaType?.startsWith('image/')) throw fieldError('file', 'That is not a photograph.');
  const sha256 = await files.keep(content);
  return sequelize.transaction(async () => {
    const [photograph, isNew] = await models.Photograph.findOrCreate({
      where: { id },
      defaults: {
        id,
        meltId: melt.id,
        sha256,
        mediaType,
        bytes: content.length,
        userId: person.id,
        terminalId: terminal.id,
        createdAt: now(),
      },
    });
    if (!isNew && (photograph.meltId !== melt.id || photograph.sha256 !== sha256))
      throw new AppError('event-refused', 'This photograph carries the mark of another one.');
    return { photograph, person: person.name };
  });
};
