import {
  DataTypes,
  Model,
  type CreationOptional,
  type InferAttributes,
  type InferCreationAttributes,
  type Sequelize,
} from 'sequelize';

/** A device at which people sign in by PIN. */
export class Terminal extends Model<InferAttributes<Terminal>, InferCreationAttributes<Terminal>> {
  declare id: CreationOptional<string>;
  declare name: string;
  declare bay: string;
  /** SHA-256 of the token the device holds. */
  declare tokenHash: string;
  declare enrolledAt: CreationOptional<Date>;
  declare lastSeenAt: CreationOptional<Date | null>;
  declare revokedAt: CreationOptional<Date | null>;

  static define(sequelize: Sequelize): typeof Terminal {
    return Terminal.init(
      {
        id: { type: DataTypes.UUID, primaryKey: true, defaultValue: DataTypes.UUIDV4 },
        name: { type: DataTypes.TEXT, allowNull: false },
        bay: { type: DataTypes.TEXT, allowNull: false },
        tokenHash: { type: DataTypes.TEXT, allowNull: false },
        enrolledAt: { type: DataTypes.DATE, allowNull: false, defaultValue: DataTypes.NOW },
        lastSeenAt: { type: DataTypes.DATE },
        revokedAt: { type: DataTypes.DATE },
      },
      { sequelize, tableName: 'terminals', timestamps: false },
    );
  }
}
