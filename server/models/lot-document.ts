import {
  DataTypes,
  Model,
  type CreationOptional,
  type InferAttributes,
  type InferCreationAttributes,
  type NonAttribute,
  type Sequelize,
} from 'sequelize';
import type { DocumentType } from '#shared/domain/metal/document-type.ts';
import type { User } from './user.ts';

/** A certificate or photograph of a lot; the file itself lies under DATA_DIR by its hash. */
export class LotDocument extends Model<InferAttributes<LotDocument>, InferCreationAttributes<LotDocument>> {
  declare id: CreationOptional<string>;
  declare lotId: string;
  declare name: string;
  declare mediaType: DocumentType;
  declare sha256: string;
  declare bytes: number;
  declare userId: string;
  declare createdAt: CreationOptional<Date>;
  declare user?: NonAttribute<User>;

  static define(sequelize: Sequelize): typeof LotDocument {
    return LotDocument.init(
      {
        id: { type: DataTypes.UUID, primaryKey: true, defaultValue: DataTypes.UUIDV4 },
        lotId: { type: DataTypes.UUID, allowNull: false },
        name: { type: DataTypes.TEXT, allowNull: false },
        mediaType: { type: DataTypes.TEXT, allowNull: false },
        sha256: { type: DataTypes.TEXT, allowNull: false },
        bytes: { type: DataTypes.INTEGER, allowNull: false },
        userId: { type: DataTypes.UUID, allowNull: false },
        createdAt: { type: DataTypes.DATE, allowNull: false, defaultValue: DataTypes.NOW },
      },
      { sequelize, tableName: 'lot_documents', timestamps: false },
    );
  }
}
