import {
  DataTypes,
  Model,
  type CreationOptional,
  type InferAttributes,
  type InferCreationAttributes,
  type Sequelize,
} from 'sequelize';
import type { WorkInstruction } from '#shared/domain/pour-card/work-instruction.ts';

/** An approved revision of the work instruction; a running card keeps the one it began with. */
export class WorkInstructionRevision extends Model<
  InferAttributes<WorkInstructionRevision>,
  InferCreationAttributes<WorkInstructionRevision>
> {
  declare id: CreationOptional<string>;
  declare number: number;
  declare content: WorkInstruction;
  declare approvedBy: string | null;
  declare approvedAt: CreationOptional<Date>;

  static define(sequelize: Sequelize): typeof WorkInstructionRevision {
    return WorkInstructionRevision.init(
      {
        id: { type: DataTypes.UUID, primaryKey: true, defaultValue: DataTypes.UUIDV4 },
        number: { type: DataTypes.INTEGER, allowNull: false },
        content: { type: DataTypes.JSONB, allowNull: false },
        approvedBy: { type: DataTypes.UUID },
        approvedAt: { type: DataTypes.DATE, allowNull: false, defaultValue: DataTypes.NOW },
      },
      { sequelize, tableName: 'work_instruction_revisions', timestamps: false },
    );
  }
}
