import { DataTypes } from 'sequelize';
import type { InferAttributes, InferCreationAttributes, Model, Sequelize } from 'sequelize';
import type { Register } from '../../shared/route/register';

export interface RegisterVersion extends Model<
  InferAttributes<RegisterVersion>,
  InferCreationAttributes<RegisterVersion>
> {
  id: string;
  shopId: string;
  version: number;
  content: Register;
  savedBy: string;
  savedAt: Date;
}

export const defineRegister = (sequelize: Sequelize) =>
  sequelize.define<RegisterVersion>(
    'register',
    {
      id: { type: DataTypes.UUID, primaryKey: true },
      shopId: { type: DataTypes.UUID, allowNull: false },
      version: { type: DataTypes.INTEGER, allowNull: false },
      content: { type: DataTypes.JSONB, allowNull: false },
      savedBy: { type: DataTypes.UUID, allowNull: false },
      savedAt: { type: DataTypes.DATE, allowNull: false },
    },
    { tableName: 'registers' },
  );
