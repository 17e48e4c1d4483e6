import type { Includeable } from 'sequelize';
import { notFound } from '../errors.ts';
import type { Alloy } from '../models/alloy.ts';
import type { AlloyRevision } from '../models/alloy-revision.ts';
import type { Casting } from '../models/casting.ts';
import type { Flask } from '../models/flask.ts';
import type { Models } from '../models/index.ts';
import type { Melt } from '../models/melt.ts';
import type { Tree } from '../models/tree.ts';
import type { User } from '../models/user.ts';
import type { Services } from '../services/services.ts';

/** A casting with all that its label names. */
export type LoadedCasting = Casting & {
  readonly flask: Flask;
  readonly tree: Tree;
  readonly alloyRevision: AlloyRevision & { readonly alloy: Alloy };
  readonly planner: User;
  readonly caster: User | null;
  readonly melt: Melt | null;
};

/** What to load with a casting so that it can be presented. */
export const castingIncludes = ({ Flask, Tree, AlloyRevision, Alloy, User, Melt }: Models): Includeable[] => [
  { model: Flask, as: 'flask' },
  { model: Tree, as: 'tree' },
  { model: AlloyRevision, as: 'alloyRevision', include: [{ model: Alloy, as: 'alloy' }] },
  { model: User, as: 'planner' },
  { model: User, as: 'caster' },
  { model: Melt, as: 'melt', attributes: ['id', 'code', 'overAt'] },
];

/** Loads a casting with all that its label names. */
export const loadCasting = async ({ models }: Services, id: string): Promise<LoadedCasting> => {
  const casting = await models.Casting.findByPk(id, { include: castingIncludes(models) });
  if (!casting) throw notFound('casting');
  return casting as LoadedCasting;
};
