import {
  DataTypes,
  Model,
  type CreationOptional,
  type InferAttributes,
  type InferCreationAttributes,
  type NonAttribute,
  type Sequelize,
} from 'sequelize';
import type { CardEvent } from '#shared/domain/pour-card/card-event.ts';
import type { Terminal } from './terminal.ts';
import type { User } from './user.ts';

/** Something that happened on a card; the database refuses to change or remove it. */
export class MeltEvent extends Model<InferAttributes<MeltEvent>, InferCreationAttributes<MeltEvent>> {
  declare id: CreationOptional<string>;
  declare meltId: string;
  /** Its place in the melt, from 1. */
  declare seq: number;
  /** Made once by the terminal, so that a second delivery records nothing. */
  declare key: string;
  declare event: CardEvent;
  declare userId: string;
  declare terminalId: string | null;
  declare occurredAt: Date;
  declare recordedAt: CreationOptional<Date>;
  declare user?: NonAttribute<User>;
  declare terminal?: NonAttribute<Terminal | null>;

  static define(sequelize: Sequelize): typeof MeltEvent {
    return MeltEvent.init(
      {
        id: { type: DataTypes.BIGINT, primaryKey: true, autoIncrement: true },
        meltId: { type: DataTypes.UUID, allowNull: false },
        seq: { type: DataTypes.INTEGER, allowNull: false },
        key: { type: DataTypes.UUID, allowNull: false },
        event: { type: DataTypes.JSONB, allowNull: false },
        userId: { type: DataTypes.UUID, allowNull: false },
        terminalId: { type: DataTypes.UUID },
        occurredAt: { type: DataTypes.DATE, allowNull: false },
        recordedAt: { type: DataTypes.DATE, allowNull: false, defaultValue: DataTypes.NOW },
      },
      { sequelize, tableName: 'melt_events', timestamps: false },
    );
  }
}
