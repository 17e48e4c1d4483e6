import { unlimited, workerRoleOf } from '#shared/domain/people/apprenticeship.ts';
import type { Worker } from '#shared/domain/pour-card/card-event.ts';
import { AppError } from '../errors.ts';
import type { AtTerminal } from '../policies/actor.ts';
import type { Services } from '../services/services.ts';

/** As what a person does a card of an alloy revision; refused when the owner keeps the alloy from this apprentice. */
export const workerFor = async (
  { models }: Services,
  { person }: AtTerminal,
  alloyRevisionId: string,
): Promise<Worker> => {
  const role = workerRoleOf(person.roles);
  if (role === 'caster') return { personId: person.id, role, parts: null };
  const user = await models.User.findByPk(person.id, { rejectOnEmpty: true });
  const { alloyIds, parts } = user.apprenticeship ?? unlimited;
  const revision = await models.AlloyRevision.findByPk(alloyRevisionId, { rejectOnEmpty: true });
  if (alloyIds !== null && !alloyIds.includes(revision.alloyId)) {
    throw new AppError(
      'not-allowed',
      'The owner has not opened this alloy to you yet. Ask a caster to take this flask.',
    );
  }
  return { personId: person.id, role, parts };
};
