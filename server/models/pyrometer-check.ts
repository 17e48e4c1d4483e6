import {
  DataTypes,
  Model,
  type CreationOptional,
  type InferAttributes,
  type InferCreationAttributes,
  type NonAttribute,
  type Sequelize,
} from 'sequelize';
import type { FixedPointName } from '#shared/domain/instrument/fixed-point.ts';
import type { User } from './user.ts';

/** One check of an instrument at a freezing point, °C; append-only. */
export class PyrometerCheck extends Model<
  InferAttributes<PyrometerCheck>,
  InferCreationAttributes<PyrometerCheck>
> {
  declare id: CreationOptional<string>;
  /** Made once by whoever asks for it, so that a second delivery records nothing. */
  declare key: string;
  declare instrumentId: string;
  declare fixedPoint: FixedPointName;
  declare readC: number;
  declare wanderC: number;
  declare offsetC: number;
  declare uncertaintyC: number;
  declare note: string;
  declare userId: string;
  declare terminalId: string | null;
  declare checkedAt: Date;
  declare recordedAt: CreationOptional<Date>;
  declare user?: NonAttribute<User>;

  static define(sequelize: Sequelize): typeof PyrometerCheck {
    return PyrometerCheck.init(
      {
        id: { type: DataTypes.BIGINT, primaryKey: true, autoIncrement: true },
        key: { type: DataTypes.UUID, allowNull: false },
        instrumentId: { type: DataTypes.UUID, allowNull: false },
        fixedPoint: { type: DataTypes.TEXT, allowNull: false },
        readC: { type: DataTypes.DOUBLE, allowNull: false, field: 'read_c' },
        wanderC: { type: DataTypes.DOUBLE, allowNull: false, field: 'wander_c' },
        offsetC: { type: DataTypes.DOUBLE, allowNull: false, field: 'offset_c' },
        uncertaintyC: { type: DataTypes.DOUBLE, allowNull: false, field: 'uncertainty_c' },
        note: { type: DataTypes.TEXT, allowNull: false },
        userId: { type: DataTypes.UUID, allowNull: false },
        terminalId: { type: DataTypes.UUID },
        checkedAt: { type: DataTypes.DATE, allowNull: false },
        recordedAt: { type: DataTypes.DATE, allowNull: false, defaultValue: DataTypes.NOW },
      },
      { sequelize, tableName: 'pyrometer_checks', timestamps: false },
    );
  }
}
