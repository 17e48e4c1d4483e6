import {
  DataTypes,
  Model,
  type CreationOptional,
  type InferAttributes,
  type InferCreationAttributes,
  type Sequelize,
} from 'sequelize';
import type { CastingState } from '#shared/domain/casting/casting-state.ts';

/** A change of a casting's state, with who and why; append-only. */
export class CastingMove extends Model<InferAttributes<CastingMove>, InferCreationAttributes<CastingMove>> {
  declare id: CreationOptional<string>;
  declare castingId: string;
  declare fromState: CastingState;
  declare toState: CastingState;
  declare reason: CreationOptional<string>;
  declare userId: string;

  static define(sequelize: Sequelize): typeof CastingMove {
    return CastingMove.init(
      {
        id: { type: DataTypes.BIGINT, primaryKey: true, autoIncrement: true },
        castingId: { type: DataTypes.UUID, allowNull: false },
        fromState: { type: DataTypes.TEXT, allowNull: false },
        toState: { type: DataTypes.TEXT, allowNull: false },
        reason: { type: DataTypes.TEXT, allowNull: false, defaultValue: '' },
        userId: { type: DataTypes.UUID, allowNull: false },
      },
      { sequelize, tableName: 'casting_moves', updatedAt: false },
    );
  }
}
