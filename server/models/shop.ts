import { DataTypes } from 'sequelize';
import type { CreationOptional, InferAttributes, InferCreationAttributes, Model, Sequelize } from 'sequelize';

export interface Shop extends Model<InferAttributes<Shop>, InferCreationAttributes<Shop>> {
  id: string;
  slug: string;
  name: string;
  timeZone: CreationOptional<string>;
  entryUnit: 'mm' | 'in';
  style: 'iso' | 'asme';
  selfRelease: CreationOptional<boolean>;
  version: CreationOptional<number>;
}

export const defineShop = (sequelize: Sequelize) =>
  sequelize.define<Shop>(
    'shop',
    {
      id: { type: DataTypes.UUID, primaryKey: true },
      slug: { type: DataTypes.TEXT, allowNull: false },
      name: { type: DataTypes.TEXT, allowNull: false },
      timeZone: { type: DataTypes.TEXT, defaultValue: 'UTC' },
      entryUnit: { type: DataTypes.TEXT, allowNull: false },
      style: { type: DataTypes.TEXT, allowNull: false },
      selfRelease: { type: DataTypes.BOOLEAN, defaultValue: false },
      version: { type: DataTypes.INTEGER, defaultValue: 0 },
    },
    { tableName: 'shops' },
  );
