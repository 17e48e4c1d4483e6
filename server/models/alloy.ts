import {
  DataTypes,
  Model,
  type CreationOptional,
  type InferAttributes,
  type InferCreationAttributes,
  type Sequelize,
} from 'sequelize';
import type { AlloyFamily } from '#shared/domain/alloy/alloy-family.ts';

/** An alloy the studio casts; its figures belong to its revisions. */
export class Alloy extends Model<InferAttributes<Alloy>, InferCreationAttributes<Alloy>> {
  declare id: CreationOptional<string>;
  declare name: string;
  declare family: AlloyFamily;

  static define(sequelize: Sequelize): typeof Alloy {
    return Alloy.init(
      {
        id: { type: DataTypes.UUID, primaryKey: true, defaultValue: DataTypes.UUIDV4 },
        name: { type: DataTypes.TEXT, allowNull: false },
        family: { type: DataTypes.TEXT, allowNull: false },
      },
      { sequelize, tableName: 'alloys', updatedAt: false },
    );
  }
}
