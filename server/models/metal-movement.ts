import {
  DataTypes,
  Model,
  type CreationOptional,
  type InferAttributes,
  type InferCreationAttributes,
  type NonAttribute,
  type Sequelize,
} from 'sequelize';
import type { Contents } from '#shared/domain/metal/contents.ts';
import type { MetalPlace, MovementKind } from '#shared/domain/metal/ledger.ts';
import type { Lot } from './lot.ts';
import type { Melt } from './melt.ts';
import type { Terminal } from './terminal.ts';
import type { User } from './user.ts';

/** One movement of metal between two places; the database refuses to change or remove it. */
export class MetalMovement extends Model<
  InferAttributes<MetalMovement>,
  InferCreationAttributes<MetalMovement>
> {
  declare id: CreationOptional<string>;
  /** Made once by whoever asks for it, so that a second delivery records nothing. */
  declare key: string;
  declare kind: MovementKind;
  declare fromPlace: MetalPlace;
  declare toPlace: MetalPlace;
  declare massMg: number;
  declare contentsMg: Contents;
  declare lotId: string | null;
  declare meltId: string | null;
  declare reason: CreationOptional<string>;
  declare correctsId: CreationOptional<string | null>;
  declare userId: string;
  declare terminalId: CreationOptional<string | null>;
  declare countersignedBy: CreationOptional<string | null>;
  declare occurredAt: Date;
  declare recordedAt: CreationOptional<Date>;
  declare user?: NonAttribute<User>;
  declare countersigner?: NonAttribute<User | null>;
  declare terminal?: NonAttribute<Terminal | null>;
  declare lot?: NonAttribute<Lot | null>;
  declare melt?: NonAttribute<Melt | null>;

  static define(sequelize: Sequelize): typeof MetalMovement {
    return MetalMovement.init(
      {
        id: { type: DataTypes.BIGINT, primaryKey: true, autoIncrement: true },
        key: { type: DataTypes.UUID, allowNull: false },
        kind: { type: DataTypes.TEXT, allowNull: false },
        fromPlace: { type: DataTypes.TEXT, allowNull: false },
        toPlace: { type: DataTypes.TEXT, allowNull: false },
        massMg: { type: DataTypes.INTEGER, allowNull: false },
        contentsMg: { type: DataTypes.JSONB, allowNull: false },
        lotId: { type: DataTypes.UUID },
        meltId: { type: DataTypes.UUID },
        reason: { type: DataTypes.TEXT, allowNull: false, defaultValue: '' },
        correctsId: { type: DataTypes.BIGINT },
        userId: { type: DataTypes.UUID, allowNull: false },
        terminalId: { type: DataTypes.UUID },
        countersignedBy: { type: DataTypes.UUID },
        occurredAt: { type: DataTypes.DATE, allowNull: false },
        recordedAt: { type: DataTypes.DATE, allowNull: false, defaultValue: DataTypes.NOW },
      },
      { sequelize, tableName: 'metal_movements', timestamps: false },
    );
  }
}
