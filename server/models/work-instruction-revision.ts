import {
  DataTypes,
  Model,
  type CreationOptional,
  type InferAttributes,
  type InferCreationAttributes,
  type NonAttribute,
  type Sequelize,
} from 'sequelize';
import type { InstructionStatus } from '#shared/contracts/instruction.ts';
import type { WorkInstruction } from '#shared/domain/instruction/work-instruction.ts';
import type { User } from './user.ts';

/** A revision of the work instruction; a running card keeps the one it began with. */
export class WorkInstructionRevision extends Model<
  InferAttributes<WorkInstructionRevision>,
  InferCreationAttributes<WorkInstructionRevision>
> {
  declare id: CreationOptional<string>;
  declare number: number;
  declare content: WorkInstruction;
  declare status: CreationOptional<InstructionStatus>;
  /** Counts the changes of a draft. */
  declare version: CreationOptional<number>;
  /** What is new, in the drafter's words. */
  declare note: CreationOptional<string>;
  /** Why whoever drafted it approved it too, in a studio of one. */
  declare exception: CreationOptional<string>;
  declare draftedBy: CreationOptional<string | null>;
  declare createdAt: CreationOptional<Date>;
  declare approvedBy: string | null;
  declare approvedAt: CreationOptional<Date | null>;
  declare drafter?: NonAttribute<User | null>;
  declare approver?: NonAttribute<User | null>;

  static define(sequelize: Sequelize): typeof WorkInstructionRevision {
    return WorkInstructionRevision.init(
      {
        id: { type: DataTypes.UUID, primaryKey: true, defaultValue: DataTypes.UUIDV4 },
        number: { type: DataTypes.INTEGER, allowNull: false },
        content: { type: DataTypes.JSONB, allowNull: false },
        status: { type: DataTypes.TEXT, allowNull: false, defaultValue: 'approved' },
        version: { type: DataTypes.INTEGER, allowNull: false, defaultValue: 1 },
        note: { type: DataTypes.TEXT, allowNull: false, defaultValue: '' },
        exception: { type: DataTypes.TEXT, allowNull: false, defaultValue: '' },
        draftedBy: { type: DataTypes.UUID },
        createdAt: { type: DataTypes.DATE, allowNull: false, defaultValue: DataTypes.NOW },
        approvedBy: { type: DataTypes.UUID },
        approvedAt: { type: DataTypes.DATE, defaultValue: DataTypes.NOW },
      },
      { sequelize, tableName: 'work_instruction_revisions', timestamps: false },
    );
  }
}
