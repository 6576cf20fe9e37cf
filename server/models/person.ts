import { DataTypes } from 'sequelize';
import type { InferAttributes, InferCreationAttributes, Model, Sequelize } from 'sequelize';

export interface Person extends Model<InferAttributes<Person>, InferCreationAttributes<Person>> {
  id: string;
  name: string;
  mail: string;
  passwordHash: string;
}

export const definePerson = (sequelize: Sequelize) =>
  sequelize.define<Person>(
    'person',
    {
      id: { type: DataTypes.UUID, primaryKey: true },
      name: { type: DataTypes.TEXT, allowNull: false },
      mail: { type: DataTypes.TEXT, allowNull: false },
      passwordHash: { type: DataTypes.TEXT, allowNull: false },
    },
    { tableName: 'people' },
  );
