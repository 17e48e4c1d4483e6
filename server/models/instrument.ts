import {
  DataTypes,
  Model,
  type CreationOptional,
  type InferAttributes,
  type InferCreationAttributes,
  type NonAttribute,
  type Sequelize,
} from 'sequelize';
import type { InstrumentKind } from '#shared/domain/instrument/instrument.ts';
import type { ThermocoupleType } from '#shared/domain/instrument/thermocouple.ts';
import type { Terminal } from './terminal.ts';

/** A thermometer, pyrometer or balance of the studio; it may send readings by itself with its token. */
export class Instrument extends Model<InferAttributes<Instrument>, InferCreationAttributes<Instrument>> {
  declare id: CreationOptional<string>;
  declare name: string;
  declare kind: InstrumentKind;
  /** The letter of a thermometer's thermocouple; null for the other kinds. */
  declare thermocouple: ThermocoupleType | null;
  /** The terminal it stands at, or null. */
  declare terminalId: string | null;
  /** SHA-256 of the token the logger holds. */
  declare tokenHash: string;
  declare active: CreationOptional<boolean>;
  declare createdBy: string;
  declare createdAt: CreationOptional<Date>;
  declare revokedAt: CreationOptional<Date | null>;
  declare terminal?: NonAttribute<Terminal | null>;

  static define(sequelize: Sequelize): typeof Instrument {
    return Instrument.init(
      {
        id: { type: DataTypes.UUID, primaryKey: true, defaultValue: DataTypes.UUIDV4 },
        name: { type: DataTypes.TEXT, allowNull: false },
        kind: { type: DataTypes.TEXT, allowNull: false },
        thermocouple: { type: DataTypes.TEXT },
        terminalId: { type: DataTypes.UUID },
        tokenHash: { type: DataTypes.TEXT, allowNull: false },
        active: { type: DataTypes.BOOLEAN, allowNull: false, defaultValue: true },
        createdBy: { type: DataTypes.UUID, allowNull: false },
        createdAt: { type: DataTypes.DATE, allowNull: false, defaultValue: DataTypes.NOW },
        revokedAt: { type: DataTypes.DATE },
      },
      { sequelize, tableName: 'instruments', timestamps: false },
    );
  }
}
