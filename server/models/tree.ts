import {
  DataTypes,
  Model,
  type CreationOptional,
  type InferAttributes,
  type InferCreationAttributes,
  type Sequelize,
} from 'sequelize';
import { numericColumn } from './numeric.ts';

/** Wax patterns on a sprue: what one flask holds. */
export class Tree extends Model<InferAttributes<Tree>, InferCreationAttributes<Tree>> {
  declare id: CreationOptional<string>;
  declare code: string;
  declare description: string;
  declare waxMassG: number;
  declare thinnestSectionMm: number;
  declare pieces: number;

  static define(sequelize: Sequelize): typeof Tree {
    return Tree.init(
      {
        id: { type: DataTypes.UUID, primaryKey: true, defaultValue: DataTypes.UUIDV4 },
        code: { type: DataTypes.TEXT, allowNull: false },
        description: { type: DataTypes.TEXT, allowNull: false },
        waxMassG: numericColumn('waxMassG', 9, 3),
        thinnestSectionMm: numericColumn('thinnestSectionMm', 5, 2),
        pieces: { type: DataTypes.INTEGER, allowNull: false },
      },
      { sequelize, tableName: 'trees', updatedAt: false },
    );
  }
}
