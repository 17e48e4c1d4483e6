import type { CreationAttributes } from 'sequelize';
import { buildCode } from '#shared/lib/codes.ts';
import type { Tree } from '#server/models/tree.ts';
import type { Services } from '#server/services/services.ts';
import { nextNumber } from './sequence.ts';

/** Builds a tree of medium section. */
export const buildTree = (
  { models }: Services,
  overrides: Partial<CreationAttributes<Tree>> = {},
): Promise<Tree> =>
  models.Tree.create({
    code: buildCode('T', nextNumber()),
    description: 'plain bands',
    waxMassG: 8,
    thinnestSectionMm: 1.2,
    pieces: 6,
    ...overrides,
  });
