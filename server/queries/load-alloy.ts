import { notFound } from '../errors.ts';
import type { Alloy } from '../models/alloy.ts';
import type { AlloyRevision } from '../models/alloy-revision.ts';
import type { Models } from '../models/index.ts';
import type { User } from '../models/user.ts';
import type { Services } from '../services/services.ts';

/** A revision with the people who drafted, checked and approved it. */
export type LoadedRevision = AlloyRevision & {
  readonly drafter: User;
  readonly checker: User | null;
  readonly approver: User | null;
};

/** An alloy with its revisions, newest first. */
export type LoadedAlloy = Alloy & { readonly revisions: LoadedRevision[] };

const revisionIncludes = ({ User }: Models) => [
  { model: User, as: 'drafter' },
  { model: User, as: 'checker' },
  { model: User, as: 'approver' },
];

const withRevisions = (models: Models) => ({
  include: [{ model: models.AlloyRevision, as: 'revisions', include: revisionIncludes(models) }],
});

/** Every alloy with its revisions, by name. */
export const listAlloys = async ({ models }: Services): Promise<LoadedAlloy[]> => {
  const alloys = await models.Alloy.findAll({
    ...withRevisions(models),
    order: [
      ['name', 'ASC'],
      ['revisions', 'number', 'DESC'],
    ],
  });
  return alloys as LoadedAlloy[];
};

/** One alloy with its revisions, newest first. */
export const loadAlloy = async ({ models }: Services, id: string): Promise<LoadedAlloy> => {
  const alloy = await models.Alloy.findByPk(id, {
    ...withRevisions(models),
    order: [['revisions', 'number', 'DESC']],
  });
  if (!alloy) throw notFound('alloy');
  return alloy as LoadedAlloy;
};

/** One revision. */
export const loadRevision = async ({ models }: Services, id: string): Promise<AlloyRevision> => {
  const revision = await models.AlloyRevision.findByPk(id);
  if (!revision) throw notFound('alloy revision');
  return revision;
};
