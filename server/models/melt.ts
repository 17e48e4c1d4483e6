import {
  DataTypes,
  Model,
  type CreationOptional,
  type InferAttributes,
  type InferCreationAttributes,
  type NonAttribute,
  type Sequelize,
} from 'sequelize';
import type { CardContext, CardState } from '#shared/domain/pour-card/card-state.ts';
import type { AlloyRevision } from './alloy-revision.ts';
import type { Casting } from './casting.ts';
import type { Terminal } from './terminal.ts';
import type { User } from './user.ts';
import type { WorkInstructionRevision } from './work-instruction-revision.ts';

/** One melt: the book's entry for a pour card. `state` is the fold of its events, kept for lists. */
export class Melt extends Model<InferAttributes<Melt>, InferCreationAttributes<Melt>> {
  declare id: CreationOptional<string>;
  declare number: number;
  declare code: string;
  /** The casting its card was opened for. */
  declare castingId: string;
  declare alloyRevisionId: string;
  declare workInstructionRevisionId: string;
  /** What the card is judged against, fixed when it was opened. */
  declare context: CardContext;
  declare state: CardState;
  declare openedBy: string;
  /** The terminal that holds the card. */
  declare terminalId: string;
  declare openedAt: Date;
  declare overAt: CreationOptional<Date | null>;
  declare alloyRevision?: NonAttribute<AlloyRevision>;
  declare workInstructionRevision?: NonAttribute<WorkInstructionRevision>;
  declare opener?: NonAttribute<User>;
  declare terminal?: NonAttribute<Terminal>;
  declare casting?: NonAttribute<Casting>;

  static define(sequelize: Sequelize): typeof Melt {
    return Melt.init(
      {
        id: { type: DataTypes.UUID, primaryKey: true, defaultValue: DataTypes.UUIDV4 },
        number: { type: DataTypes.INTEGER, allowNull: false },
        code: { type: DataTypes.TEXT, allowNull: false },
        castingId: { type: DataTypes.UUID, allowNull: false },
        alloyRevisionId: { type: DataTypes.UUID, allowNull: false },
        workInstructionRevisionId: { type: DataTypes.UUID, allowNull: false },
        context: { type: DataTypes.JSONB, allowNull: false },
        state: { type: DataTypes.JSONB, allowNull: false },
        openedBy: { type: DataTypes.UUID, allowNull: false },
        terminalId: { type: DataTypes.UUID, allowNull: false },
        openedAt: { type: DataTypes.DATE, allowNull: false },
        overAt: { type: DataTypes.DATE },
      },
      { sequelize, tableName: 'melts', timestamps: false },
    );
  }
}
