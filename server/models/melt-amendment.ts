import {
  DataTypes,
  Model,
  type CreationOptional,
  type InferAttributes,
  type InferCreationAttributes,
  type NonAttribute,
  type Sequelize,
} from 'sequelize';
import type { User } from './user.ts';

/** A remark added to a melt after the fact; append-only. */
export class MeltAmendment extends Model<
  InferAttributes<MeltAmendment>,
  InferCreationAttributes<MeltAmendment>
> {
  declare id: CreationOptional<string>;
  declare meltId: string;
  /** The event it corrects, or null for the melt as a whole. */
  declare seq: number | null;
  declare note: string;
  declare userId: string;
  declare createdAt: CreationOptional<Date>;
  declare user?: NonAttribute<User>;

  static define(sequelize: Sequelize): typeof MeltAmendment {
    return MeltAmendment.init(
      {
        id: { type: DataTypes.BIGINT, primaryKey: true, autoIncrement: true },
        meltId: { type: DataTypes.UUID, allowNull: false },
        seq: { type: DataTypes.INTEGER },
        note: { type: DataTypes.TEXT, allowNull: false },
        userId: { type: DataTypes.UUID, allowNull: false },
        createdAt: DataTypes.DATE,
      },
      { sequelize, tableName: 'melt_amendments', updatedAt: false },
    );
  }
}
