import {
  DataTypes,
  Model,
  type CreationOptional,
  type InferAttributes,
  type InferCreationAttributes,
  type Sequelize,
} from 'sequelize';
import type { MarkPlace } from '#shared/domain/metal/fineness-marks.ts';
import type { ProcessTables } from '#shared/domain/studio/process-tables.ts';
import type { StudioLimits } from '#shared/domain/studio/studio-limits.ts';
import type { MassUnit, TemperatureUnit } from '#shared/lib/units.ts';

/** The studio's settings: one row. */
export class StudioSettings extends Model<
  InferAttributes<StudioSettings>,
  InferCreationAttributes<StudioSettings>
> {
  declare id: CreationOptional<number>;
  declare version: CreationOptional<number>;
  declare name: string;
  declare temperatureUnit: TemperatureUnit;
  declare massUnit: MassUnit;
  declare timeZone: string;
  declare idleLockS: number;
  declare processTables: ProcessTables;
  declare limits: StudioLimits;
  declare marksPlace: CreationOptional<MarkPlace>;
  /** Days after which an instrument is to be checked again. */
  declare pyrometerCheckDays: CreationOptional<number>;

  static define(sequelize: Sequelize): typeof StudioSettings {
    return StudioSettings.init(
      {
        id: { type: DataTypes.SMALLINT, primaryKey: true, defaultValue: 1 },
        version: { type: DataTypes.INTEGER, allowNull: false, defaultValue: 1 },
        name: { type: DataTypes.TEXT, allowNull: false },
        temperatureUnit: { type: DataTypes.TEXT, allowNull: false },
        massUnit: { type: DataTypes.TEXT, allowNull: false },
        timeZone: { type: DataTypes.TEXT, allowNull: false },
        idleLockS: { type: DataTypes.INTEGER, allowNull: false },
        processTables: { type: DataTypes.JSONB, allowNull: false },
        limits: { type: DataTypes.JSONB, allowNull: false },
        pyrometerCheckDays: { type: DataTypes.INTEGER, allowNull: false, defaultValue: 30 },
        marksPlace: { type: DataTypes.TEXT, allowNull: false, defaultValue: 'ISO 9202' },
      },
      { sequelize, tableName: 'studio_settings' },
    );
  }
}
