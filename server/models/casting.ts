import {
  DataTypes,
  Model,
  type CreationOptional,
  type InferAttributes,
  type InferCreationAttributes,
  type NonAttribute,
  type Sequelize,
} from 'sequelize';
import type { CastingMethod } from '#shared/domain/casting/casting-method.ts';
import type { CastingState } from '#shared/domain/casting/casting-state.ts';
import type { AlloyRevision } from './alloy-revision.ts';
import type { Flask } from './flask.ts';
import type { Melt } from './melt.ts';
import { numericColumn } from './numeric.ts';
import type { Tree } from './tree.ts';
import type { User } from './user.ts';

/** One use of a flask. */
export class Casting extends Model<InferAttributes<Casting>, InferCreationAttributes<Casting>> {
  declare id: CreationOptional<string>;
  declare flaskId: string;
  declare treeId: string;
  declare alloyRevisionId: string;
  declare method: CastingMethod;
  declare state: CastingState;
  declare stateReason: CreationOptional<string>;
  declare plannedMetalG: number;
  declare plannedPourAt: Date;
  declare bay: string;
  declare plannedBy: string;
  declare casterId: string | null;
  declare meltId: CreationOptional<string | null>;
  declare flask?: NonAttribute<Flask>;
  declare tree?: NonAttribute<Tree>;
  declare alloyRevision?: NonAttribute<AlloyRevision>;
  declare planner?: NonAttribute<User>;
  declare caster?: NonAttribute<User | null>;
  declare melt?: NonAttribute<Melt | null>;

  static define(sequelize: Sequelize): typeof Casting {
    return Casting.init(
      {
        id: { type: DataTypes.UUID, primaryKey: true, defaultValue: DataTypes.UUIDV4 },
        flaskId: { type: DataTypes.UUID, allowNull: false },
        treeId: { type: DataTypes.UUID, allowNull: false },
        alloyRevisionId: { type: DataTypes.UUID, allowNull: false },
        method: { type: DataTypes.TEXT, allowNull: false },
        state: { type: DataTypes.TEXT, allowNull: false },
        stateReason: { type: DataTypes.TEXT, allowNull: false, defaultValue: '' },
        plannedMetalG: numericColumn('plannedMetalG', 9, 3),
        plannedPourAt: { type: DataTypes.DATE, allowNull: false },
        bay: { type: DataTypes.TEXT, allowNull: false },
        plannedBy: { type: DataTypes.UUID, allowNull: false },
        casterId: { type: DataTypes.UUID },
        meltId: { type: DataTypes.UUID },
      },
      { sequelize, tableName: 'castings' },
    );
  }
}
