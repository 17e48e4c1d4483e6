import {
  DataTypes,
  Model,
  type CreationOptional,
  type InferAttributes,
  type InferCreationAttributes,
  type Sequelize,
} from 'sequelize';

/** A melt temperature of the book, in °C; append-only, one for each reading event. */
export class Reading extends Model<InferAttributes<Reading>, InferCreationAttributes<Reading>> {
  declare id: CreationOptional<string>;
  declare meltId: string;
  declare meltEventId: string;
  declare temperatureC: number;
  declare takenAt: Date;

  static define(sequelize: Sequelize): typeof Reading {
    return Reading.init(
      {
        id: { type: DataTypes.BIGINT, primaryKey: true, autoIncrement: true },
        meltId: { type: DataTypes.UUID, allowNull: false },
        meltEventId: { type: DataTypes.BIGINT, allowNull: false },
        temperatureC: { type: DataTypes.DOUBLE, allowNull: false, field: 'temperature_c' },
        takenAt: { type: DataTypes.DATE, allowNull: false },
      },
      { sequelize, tableName: 'readings', timestamps: false },
    );
  }
}
