import type { CreationAttributes } from 'sequelize';
import type { Casting } from '#server/models/casting.ts';
import type { Services } from '#server/services/services.ts';
import { buildAlloyRevision } from './build-alloy-revision.ts';
import { buildFlask } from './build-flask.ts';
import { buildTree } from './build-tree.ts';
import { buildUser } from './build-user.ts';

/** The planned metal of every built casting that is given no other, g. */
export const PLANNED_G = 100;

/** Builds a casting with its flask, tree, alloy revision and planner; holding, ready to pour, unless told otherwise. */
export const buildCasting = async (
  services: Services,
  overrides: Partial<CreationAttributes<Casting>> = {},
): Promise<Casting> =>
  services.models.Casting.create({
    method: 'vacuum',
    state: 'holding',
    plannedMetalG: PLANNED_G,
    plannedPourAt: new Date(services.now().getTime() + 600_000),
    bay: 'furnace bay 1',
    casterId: null,
    ...overrides,
    flaskId: overrides.flaskId ?? (await buildFlask(services)).id,
    treeId: overrides.treeId ?? (await buildTree(services)).id,
    alloyRevisionId: overrides.alloyRevisionId ?? (await buildAlloyRevision(services)).id,
    plannedBy: overrides.plannedBy ?? (await buildUser(services, { roles: ['owner'] })).id,
  });
