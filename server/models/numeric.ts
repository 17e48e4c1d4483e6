import { DataTypes, type Model, type ModelAttributeColumnOptions } from 'sequelize';

/** A PostgreSQL numeric column read as a JavaScript number, which the driver would hand over as text. */
export const numericColumn = (
  name: string,
  precision: number,
  scale: number,
): ModelAttributeColumnOptions<Model> => ({
  type: DataTypes.DECIMAL(precision, scale),
  allowNull: false,
  get(this: Model): number {
    return Number(this.getDataValue(name as never));
  },
});
