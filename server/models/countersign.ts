import {
  DataTypes,
  Model,
  type InferAttributes,
  type InferCreationAttributes,
  type Sequelize,
} from 'sequelize';

/** A second person's sign for something on a melt, given at a terminal; the database refuses to change or remove it. */
export class Countersign extends Model<InferAttributes<Countersign>, InferCreationAttributes<Countersign>> {
  declare id: string;
  declare meltId: string;
  declare personId: string;
  /** Who was signed in at the terminal. */
  declare askedBy: string;
  declare terminalId: string;
  declare signedAt: Date;

  static define(sequelize: Sequelize): typeof Countersign {
    return Countersign.init(
      {
        id: { type: DataTypes.UUID, primaryKey: true },
        meltId: { type: DataTypes.UUID, allowNull: false },
        personId: { type: DataTypes.UUID, allowNull: false },
        askedBy: { type: DataTypes.UUID, allowNull: false },
        terminalId: { type: DataTypes.UUID, allowNull: false },
        signedAt: { type: DataTypes.DATE, allowNull: false },
      },
      { sequelize, tableName: 'countersigns', timestamps: false },
    );
  }
}
