import {
  DataTypes,
  Model,
  type CreationOptional,
  type InferAttributes,
  type InferCreationAttributes,
  type Sequelize,
} from 'sequelize';
import type { Apprenticeship } from '#shared/domain/people/apprenticeship.ts';
import type { Role } from '#shared/domain/people/role.ts';

/** A person of the studio. */
export class User extends Model<InferAttributes<User>, InferCreationAttributes<User>> {
  declare id: CreationOptional<string>;
  declare name: string;
  declare login: string;
  /** Where notices go; null for none. */
  declare email: CreationOptional<string | null>;
  declare roles: Role[];
  declare active: CreationOptional<boolean>;
  /** What they may do as an apprentice; null for everything. */
  declare apprenticeship: CreationOptional<Apprenticeship | null>;
  declare passwordHash: string;
  declare pinHash: string | null;
  /** Wrong PINs in a row. */
  declare pinFailures: CreationOptional<number>;
  /** Until when further PINs are not looked at. */
  declare pinWaitUntil: CreationOptional<Date | null>;
  /** Since when PIN sign-in is closed, until the owner opens it. */
  declare pinLockedAt: CreationOptional<Date | null>;
  declare passwordFailures: CreationOptional<number>;
  declare passwordWaitUntil: CreationOptional<Date | null>;

  static define(sequelize: Sequelize): typeof User {
    return User.init(
      {
        id: { type: DataTypes.UUID, primaryKey: true, defaultValue: DataTypes.UUIDV4 },
        name: { type: DataTypes.TEXT, allowNull: false },
        login: { type: DataTypes.TEXT, allowNull: false },
        email: { type: DataTypes.TEXT },
        roles: { type: DataTypes.ARRAY(DataTypes.TEXT), allowNull: false },
        active: { type: DataTypes.BOOLEAN, allowNull: false, defaultValue: true },
        apprenticeship: { type: DataTypes.JSONB },
        passwordHash: { type: DataTypes.TEXT, allowNull: false },
        pinHash: { type: DataTypes.TEXT },
        pinFailures: { type: DataTypes.INTEGER, allowNull: false, defaultValue: 0 },
        pinWaitUntil: { type: DataTypes.DATE },
        pinLockedAt: { type: DataTypes.DATE },
        passwordFailures: { type: DataTypes.INTEGER, allowNull: false, defaultValue: 0 },
        passwordWaitUntil: { type: DataTypes.DATE },
      },
      { sequelize, tableName: 'users' },
    );
  }
}
