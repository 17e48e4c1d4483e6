import {
  DataTypes,
  Model,
  type CreationOptional,
  type InferAttributes,
  type InferCreationAttributes,
  type NonAttribute,
  type Sequelize,
} from 'sequelize';
import type { AlloyRevision as AlloyRevisionContract, RevisionStatus } from '#shared/contracts/alloy.ts';
import type { AlloyFigures } from '#shared/domain/alloy/alloy-figures.ts';
import type { QuenchRule } from '#shared/domain/alloy/quench-rule.ts';
import type { Alloy } from './alloy.ts';
import type { User } from './user.ts';

/** One revision of an alloy; frozen by the database once it is approved. */
export class AlloyRevision extends Model<
  InferAttributes<AlloyRevision>,
  InferCreationAttributes<AlloyRevision>
> {
  declare id: CreationOptional<string>;
  declare alloyId: string;
  declare number: number;
  declare status: CreationOptional<RevisionStatus>;
  declare compositionWt: Record<string, number>;
  declare toleranceWt: CreationOptional<Record<string, number>>;
  declare fineness: number;
  declare figures: AlloyFigures;
  declare outsideModel: CreationOptional<string>;
  declare quench: QuenchRule;
  declare measured: AlloyRevisionContract['measured'];
  declare note: CreationOptional<string>;
  declare draftedBy: string;
  declare checkedBy: CreationOptional<string | null>;
  declare checkedAt: CreationOptional<Date | null>;
  declare approvedBy: CreationOptional<string | null>;
  declare approvedAt: CreationOptional<Date | null>;
  declare alloy?: NonAttribute<Alloy>;
  declare drafter?: NonAttribute<User>;
  declare checker?: NonAttribute<User | null>;
  declare approver?: NonAttribute<User | null>;

  static define(sequelize: Sequelize): typeof AlloyRevision {
    return AlloyRevision.init(
      {
        id: { type: DataTypes.UUID, primaryKey: true, defaultValue: DataTypes.UUIDV4 },
        alloyId: { type: DataTypes.UUID, allowNull: false },
        number: { type: DataTypes.INTEGER, allowNull: false },
        status: { type: DataTypes.TEXT, allowNull: false, defaultValue: 'draft' },
        compositionWt: { type: DataTypes.JSONB, allowNull: false },
        toleranceWt: { type: DataTypes.JSONB, allowNull: false, defaultValue: {} },
        fineness: { type: DataTypes.INTEGER, allowNull: false },
        figures: { type: DataTypes.JSONB, allowNull: false },
        outsideModel: { type: DataTypes.TEXT, allowNull: false, defaultValue: '' },
        quench: { type: DataTypes.JSONB, allowNull: false },
        measured: { type: DataTypes.JSONB },
        note: { type: DataTypes.TEXT, allowNull: false, defaultValue: '' },
        draftedBy: { type: DataTypes.UUID, allowNull: false },
        checkedBy: { type: DataTypes.UUID },
        checkedAt: { type: DataTypes.DATE },
        approvedBy: { type: DataTypes.UUID },
        approvedAt: { type: DataTypes.DATE },
      },
      { sequelize, tableName: 'alloy_revisions', updatedAt: false },
    );
  }
}
