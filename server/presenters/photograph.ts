import type { Photograph as PhotographContract } from '#shared/contracts/card.ts';
import type { KeptPhotograph } from '../commands/add-photograph.ts';

/** A photograph of a melt. */
export const presentPhotograph = ({ photograph, person }: KeptPhotograph): PhotographContract => ({
  id: photograph.id,
  mediaType: photograph.mediaType,
  bytes: photograph.bytes,
  person,
  at: photograph.createdAt.toISOString(),
});
