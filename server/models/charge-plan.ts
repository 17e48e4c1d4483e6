import {
  DataTypes,
  Model,
  type CreationOptional,
  type InferAttributes,
  type InferCreationAttributes,
  type NonAttribute,
  type Sequelize,
} from 'sequelize';
import type { PlannedLine } from '#shared/domain/metal/planned-line.ts';
import type { User } from './user.ts';

/** A charge planned for one casting, or for several poured from one melt; the newest counts. */
export class ChargePlan extends Model<InferAttributes<ChargePlan>, InferCreationAttributes<ChargePlan>> {
  declare id: CreationOptional<string>;
  declare castingIds: string[];
  declare alloyRevisionId: string;
  declare wantedMg: number;
  declare lines: readonly PlannedLine[];
  declare expectedPpt: number;
  declare worstPpt: number;
  declare returnsShare: number;
  declare userId: string;
  declare createdAt: CreationOptional<Date>;
  declare user?: NonAttribute<User>;

  static define(sequelize: Sequelize): typeof ChargePlan {
    return ChargePlan.init(
      {
        id: { type: DataTypes.BIGINT, primaryKey: true, autoIncrement: true },
        castingIds: { type: DataTypes.ARRAY(DataTypes.UUID), allowNull: false },
        alloyRevisionId: { type: DataTypes.UUID, allowNull: false },
        wantedMg: { type: DataTypes.INTEGER, allowNull: false },
        lines: { type: DataTypes.JSONB, allowNull: false },
        expectedPpt: { type: DataTypes.DOUBLE, allowNull: false },
        worstPpt: { type: DataTypes.DOUBLE, allowNull: false },
        returnsShare: { type: DataTypes.DOUBLE, allowNull: false },
        userId: { type: DataTypes.UUID, allowNull: false },
        createdAt: { type: DataTypes.DATE, allowNull: false, defaultValue: DataTypes.NOW },
      },
      { sequelize, tableName: 'charge_plans', timestamps: false },
    );
  }
}
