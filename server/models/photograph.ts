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

/** A photograph taken on a pour card; the file itself lies under DATA_DIR by its hash. */
export class Photograph extends Model<InferAttributes<Photograph>, InferCreationAttributes<Photograph>> {
  declare id: string;
  declare meltId: string;
  declare sha256: string;
  declare mediaType: string;
  declare bytes: number;
  declare userId: string;
  declare terminalId: string;
  declare createdAt: CreationOptional<Date>;
  declare user?: NonAttribute<User>;

  static define(sequelize: Sequelize): typeof Photograph {
    return Photograph.init(
      {
        id: { type: DataTypes.UUID, primaryKey: true },
        meltId: { type: DataTypes.UUID, allowNull: false },
        sha256: { type: DataTypes.TEXT, allowNull: false },
        mediaType: { type: DataTypes.TEXT, allowNull: false },
        bytes: { type: DataTypes.INTEGER, allowNull: false },
        userId: { type: DataTypes.UUID, allowNull: false },
        terminalId: { type: DataTypes.UUID, allowNull: false },
        createdAt: { type: DataTypes.DATE, allowNull: false, defaultValue: DataTypes.NOW },
      },
      { sequelize, tableName: 'photographs', timestamps: false },
    );
  }
}
