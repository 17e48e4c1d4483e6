import {
  DataTypes,
  Model,
  type CreationOptional,
  type InferAttributes,
  type InferCreationAttributes,
  type Sequelize,
} from 'sequelize';
import { numericColumn } from './numeric.ts';

/** A steel cylinder, used hundreds of times. */
export class Flask extends Model<InferAttributes<Flask>, InferCreationAttributes<Flask>> {
  declare id: CreationOptional<string>;
  declare code: string;
  declare diameterMm: number;
  declare heightMm: number;

  static define(sequelize: Sequelize): typeof Flask {
    return Flask.init(
      {
        id: { type: DataTypes.UUID, primaryKey: true, defaultValue: DataTypes.UUIDV4 },
        code: { type: DataTypes.TEXT, allowNull: false },
        diameterMm: numericColumn('diameterMm', 6, 1),
        heightMm: numericColumn('heightMm', 6, 1),
      },
      { sequelize, tableName: 'flasks', updatedAt: false },
    );
  }
}
