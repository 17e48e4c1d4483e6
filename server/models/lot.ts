import {
  DataTypes,
  Model,
  type CreationOptional,
  type InferAttributes,
  type InferCreationAttributes,
  type NonAttribute,
  type Sequelize,
} from 'sequelize';
import type { Contents } from '#shared/domain/metal/contents.ts';
import type { LotKind, Parts } from '#shared/domain/metal/lot.ts';
import type { AlloyRevision } from './alloy-revision.ts';
import type { Melt } from './melt.ts';
import type { User } from './user.ts';

/** A lot of metal. The database keeps balance, contents, assay, place and quarantine from its movements and amendments alone. */
export class Lot extends Model<InferAttributes<Lot>, InferCreationAttributes<Lot>> {
  declare id: CreationOptional<string>;
  declare number: number;
  declare code: string;
  declare name: string;
  declare kind: LotKind;
  /** The alloy it is grain or returns of. */
  declare alloyRevisionId: string | null;
  /** The melt whose button it is. */
  declare meltId: string | null;
  declare compositionWt: Parts;
  declare toleranceWt: Parts;
  declare supplier: CreationOptional<string>;
  declare supplierReference: CreationOptional<string>;
  declare place: CreationOptional<string>;
  /** Why it may not be used; null when it may. */
  declare quarantineReason: CreationOptional<string | null>;
  declare balanceMg: CreationOptional<number>;
  declare contentsMg: CreationOptional<Contents>;
  declare receivedMg: number;
  declare receivedAt: Date;
  declare receivedBy: string;
  declare createdAt: CreationOptional<Date>;
  declare alloyRevision?: NonAttribute<AlloyRevision | null>;
  declare melt?: NonAttribute<Melt | null>;
  declare receiver?: NonAttribute<User>;

  static define(sequelize: Sequelize): typeof Lot {
    return Lot.init(
      {
        id: { type: DataTypes.UUID, primaryKey: true, defaultValue: DataTypes.UUIDV4 },
        number: { type: DataTypes.INTEGER, allowNull: false },
        code: { type: DataTypes.TEXT, allowNull: false },
        name: { type: DataTypes.TEXT, allowNull: false },
        kind: { type: DataTypes.TEXT, allowNull: false },
        alloyRevisionId: { type: DataTypes.UUID },
        meltId: { type: DataTypes.UUID },
        compositionWt: { type: DataTypes.JSONB, allowNull: false },
        toleranceWt: { type: DataTypes.JSONB, allowNull: false },
        supplier: { type: DataTypes.TEXT, allowNull: false, defaultValue: '' },
        supplierReference: { type: DataTypes.TEXT, allowNull: false, defaultValue: '' },
        place: { type: DataTypes.TEXT, allowNull: false, defaultValue: '' },
        quarantineReason: { type: DataTypes.TEXT },
        balanceMg: { type: DataTypes.INTEGER, allowNull: false, defaultValue: 0 },
        contentsMg: { type: DataTypes.JSONB, allowNull: false, defaultValue: {} },
        receivedMg: { type: DataTypes.INTEGER, allowNull: false },
        receivedAt: { type: DataTypes.DATE, allowNull: false },
        receivedBy: { type: DataTypes.UUID, allowNull: false },
        createdAt: { type: DataTypes.DATE, allowNull: false, defaultValue: DataTypes.NOW },
      },
      { sequelize, tableName: 'lots', timestamps: false },
    );
  }
}
