import {
  DataTypes,
  Model,
  type CreationOptional,
  type InferAttributes,
  type InferCreationAttributes,
  type Sequelize,
} from 'sequelize';

/** A one-time code with which a device becomes a terminal. */
export class TerminalEnrolment extends Model<
  InferAttributes<TerminalEnrolment>,
  InferCreationAttributes<TerminalEnrolment>
> {
  declare id: CreationOptional<string>;
  /** SHA-256 of the code. */
  declare codeHash: string;
  declare name: string;
  declare bay: string;
  declare createdBy: string | null;
  declare expiresAt: Date;
  declare usedAt: CreationOptional<Date | null>;

  static define(sequelize: Sequelize): typeof TerminalEnrolment {
    return TerminalEnrolment.init(
      {
        id: { type: DataTypes.UUID, primaryKey: true, defaultValue: DataTypes.UUIDV4 },
        codeHash: { type: DataTypes.TEXT, allowNull: false },
        name: { type: DataTypes.TEXT, allowNull: false },
        bay: { type: DataTypes.TEXT, allowNull: false },
        createdBy: { type: DataTypes.UUID },
        expiresAt: { type: DataTypes.DATE, allowNull: false },
        usedAt: { type: DataTypes.DATE },
      },
      { sequelize, tableName: 'terminal_enrolments', updatedAt: false },
    );
  }
}
