import {
  DataTypes,
  Model,
  type CreationOptional,
  type InferAttributes,
  type InferCreationAttributes,
  type NonAttribute,
  type Sequelize,
} from 'sequelize';
import type { Lot } from './lot.ts';
import type { User } from './user.ts';

/** A lot as counted on the balance, beside what the ledger expected; the difference is a movement. */
export class StockCount extends Model<InferAttributes<StockCount>, InferCreationAttributes<StockCount>> {
  declare id: CreationOptional<string>;
  declare lotId: string;
  declare expectedMg: number;
  declare countedMg: number;
  declare explanation: string;
  declare movementId: string | null;
  declare userId: string;
  declare countedAt: Date;
  declare user?: NonAttribute<User>;
  declare lot?: NonAttribute<Lot>;

  static define(sequelize: Sequelize): typeof StockCount {
    return StockCount.init(
      {
        id: { type: DataTypes.BIGINT, primaryKey: true, autoIncrement: true },
        lotId: { type: DataTypes.UUID, allowNull: false },
        expectedMg: { type: DataTypes.INTEGER, allowNull: false },
        countedMg: { type: DataTypes.INTEGER, allowNull: false },
        explanation: { type: DataTypes.TEXT, allowNull: false },
        movementId: { type: DataTypes.BIGINT },
        userId: { type: DataTypes.UUID, allowNull: false },
        countedAt: { type: DataTypes.DATE, allowNull: false },
      },
      { sequelize, tableName: 'stock_counts', timestamps: false },
    );
  }
}
