import {
  DataTypes,
  Model,
  type CreationOptional,
  type InferAttributes,
  type InferCreationAttributes,
  type NonAttribute,
  type Sequelize,
} from 'sequelize';
import type { CurvePoint } from '#shared/domain/cooling-curve/curve-point.ts';
import type { CurveVerdict } from '#shared/domain/cooling-curve/judge-curve.ts';
import type { Instrument } from './instrument.ts';
import type { User } from './user.ts';

/** A logged cooling curve of a melt with what was made of it when it came; append-only. */
export class CoolingCurve extends Model<
  InferAttributes<CoolingCurve>,
  InferCreationAttributes<CoolingCurve>
> {
  declare id: CreationOptional<string>;
  /** Made once by whoever asks for it, so that a second delivery records nothing. */
  declare key: string;
  declare meltId: string;
  declare instrumentId: string | null;
  declare source: 'live' | 'table';
  /** As the instrument gave them, without the offset. */
  declare points: readonly CurvePoint[];
  declare offsetC: number;
  /** How far the thermometer was taken to be off, ± °C. */
  declare thermometerC: number;
  declare verdict: CurveVerdict;
  declare note: string;
  declare userId: string;
  declare terminalId: string | null;
  declare recordedAt: CreationOptional<Date>;
  declare user?: NonAttribute<User>;
  declare instrument?: NonAttribute<Instrument | null>;

  static define(sequelize: Sequelize): typeof CoolingCurve {
    return CoolingCurve.init(
      {
        id: { type: DataTypes.BIGINT, primaryKey: true, autoIncrement: true },
        key: { type: DataTypes.UUID, allowNull: false },
        meltId: { type: DataTypes.UUID, allowNull: false },
        instrumentId: { type: DataTypes.UUID },
        source: { type: DataTypes.TEXT, allowNull: false },
        points: { type: DataTypes.JSONB, allowNull: false },
        offsetC: { type: DataTypes.DOUBLE, allowNull: false, field: 'offset_c' },
        thermometerC: { type: DataTypes.DOUBLE, allowNull: false, field: 'thermometer_c' },
        verdict: { type: DataTypes.JSONB, allowNull: false },
        note: { type: DataTypes.TEXT, allowNull: false },
        userId: { type: DataTypes.UUID, allowNull: false },
        terminalId: { type: DataTypes.UUID },
        recordedAt: { type: DataTypes.DATE, allowNull: false, defaultValue: DataTypes.NOW },
      },
      { sequelize, tableName: 'cooling_curves', timestamps: false },
    );
  }
}
