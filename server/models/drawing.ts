import { DataTypes } from 'sequelize';
import type { InferAttributes, InferCreationAttributes, Model, Sequelize } from 'sequelize';

export interface Drawing extends Model<InferAttributes<Drawing>, InferCreationAttributes<Drawing>> {
  id: string;
  shopId: string;
  number: string;
  template: string;
  createdBy: string;
}

export const defineDrawing = (sequelize: Sequelize) =>
  sequelize.define<Drawing>(
    'drawing',
    {
      id: { type: DataTypes.UUID, primaryKey: true },
      shopId: { type: DataTypes.UUID, allowNull: false },
      number: { type: DataTypes.TEXT, allowNull: false },
      template: { type: DataTypes.TEXT, allowNull: false },
      createdBy: { type: DataTypes.UUID, allowNull: false },
    },
    { tableName: 'drawings' },
  );
