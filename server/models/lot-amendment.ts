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
import type { AmendmentKind, Parts } from '#shared/domain/metal/lot.ts';
import type { User } from './user.ts';

/** What was found out or decided about a lot later; the database refuses to change or remove it. */
export class LotAmendment extends Model<
  InferAttributes<LotAmendment>,
  InferCreationAttributes<LotAmendment>
> {
  declare id: CreationOptional<string>;
  declare lotId: string;
  declare kind: AmendmentKind;
  declare compositionWt: CreationOptional<Parts | null>;
  declare toleranceWt: CreationOptional<Parts | null>;
  /** What a new assay changes in what the ledger says is on hand, mg by element. */
  declare contentsChangeMg: CreationOptional<Contents>;
  declare place: CreationOptional<string | null>;
  declare reason: string;
  declare userId: string;
  declare createdAt: CreationOptional<Date>;
  declare user?: NonAttribute<User>;

  static define(sequelize: Sequelize): typeof LotAmendment {
    return LotAmendment.init(
      {
        id: { type: DataTypes.BIGINT, primaryKey: true, autoIncrement: true },
        lotId: { type: DataTypes.UUID, allowNull: false },
        kind: { type: DataTypes.TEXT, allowNull: false },
        compositionWt: { type: DataTypes.JSONB },
        toleranceWt: { type: DataTypes.JSONB },
        contentsChangeMg: { type: DataTypes.JSONB, allowNull: false, defaultValue: {} },
        place: { type: DataTypes.TEXT },
        reason: { type: DataTypes.TEXT, allowNull: false },
        userId: { type: DataTypes.UUID, allowNull: false },
        createdAt: { type: DataTypes.DATE, allowNull: false, defaultValue: DataTypes.NOW },
      },
      { sequelize, tableName: 'lot_amendments', timestamps: false },
    );
  }
}
