import {
  DataTypes,
  Model,
  type InferAttributes,
  type InferCreationAttributes,
  type Sequelize,
} from 'sequelize';
import type { Contents } from '#shared/domain/metal/contents.ts';

/** What the ledger says is in the crucible of a melt; the database keeps it from the movements alone. */
export class Crucible extends Model<InferAttributes<Crucible>, InferCreationAttributes<Crucible>> {
  declare meltId: string;
  declare balanceMg: number;
  declare contentsMg: Contents;

  static define(sequelize: Sequelize): typeof Crucible {
    return Crucible.init(
      {
        meltId: { type: DataTypes.UUID, primaryKey: true },
        balanceMg: { type: DataTypes.INTEGER, allowNull: false },
        contentsMg: { type: DataTypes.JSONB, allowNull: false },
      },
      { sequelize, tableName: 'crucibles', timestamps: false },
    );
  }
}
