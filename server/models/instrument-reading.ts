import {
  DataTypes,
  Model,
  type CreationOptional,
  type InferAttributes,
  type InferCreationAttributes,
  type NonAttribute,
  type Sequelize,
} from 'sequelize';
import type { ThermometerFault } from '#shared/domain/instrument/read-thermometer-line.ts';
import type { Flask } from './flask.ts';

/** One reading that an instrument sent, or a flask's mould temperature out of the furnace; append-only. */
export class InstrumentReading extends Model<
  InferAttributes<InstrumentReading>,
  InferCreationAttributes<InstrumentReading>
> {
  declare id: CreationOptional<string>;
  /** The key of the delivery it came in, and its place there. */
  declare key: string;
  declare place: number;
  declare instrumentId: string | null;
  declare terminalId: string | null;
  declare userId: string | null;
  /** As the instrument gave it, °C; null where it told a fault. */
  declare rawC: number | null;
  declare fault: CreationOptional<ThermometerFault | null>;
  /** What the last check at that time says is to be added, °C. */
  declare offsetC: number;
  declare sequence: CreationOptional<number | null>;
  declare flaskId: CreationOptional<string | null>;
  declare castingId: CreationOptional<string | null>;
  /** The same for all readings of one time out of the furnace. */
  declare outingId: CreationOptional<string | null>;
  declare secondsOut: CreationOptional<number | null>;
  declare roomC: CreationOptional<number | null>;
  declare takenAt: Date;
  declare recordedAt: CreationOptional<Date>;
  declare flask?: NonAttribute<Flask | null>;

  static define(sequelize: Sequelize): typeof InstrumentReading {
    return InstrumentReading.init(
      {
        id: { type: DataTypes.BIGINT, primaryKey: true, autoIncrement: true },
        key: { type: DataTypes.UUID, allowNull: false },
        place: { type: DataTypes.INTEGER, allowNull: false },
        instrumentId: { type: DataTypes.UUID },
        terminalId: { type: DataTypes.UUID },
        userId: { type: DataTypes.UUID },
        rawC: { type: DataTypes.DOUBLE, field: 'raw_c' },
        fault: { type: DataTypes.TEXT },
        offsetC: { type: DataTypes.DOUBLE, allowNull: false, field: 'offset_c' },
        sequence: { type: DataTypes.INTEGER },
        flaskId: { type: DataTypes.UUID },
        castingId: { type: DataTypes.UUID },
        outingId: { type: DataTypes.UUID },
        secondsOut: { type: DataTypes.DOUBLE },
        roomC: { type: DataTypes.DOUBLE, field: 'room_c' },
        takenAt: { type: DataTypes.DATE, allowNull: false },
        recordedAt: { type: DataTypes.DATE, allowNull: false, defaultValue: DataTypes.NOW },
      },
      { sequelize, tableName: 'instrument_readings', timestamps: false },
    );
  }
}
