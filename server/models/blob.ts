import { DataTypes } from 'sequelize';
import type { InferAttributes, InferCreationAttributes, Model, Sequelize } from 'sequelize';

export interface Blob extends Model<InferAttributes<Blob>, InferCreationAttributes<Blob>> {
  shopId: string;
  hash: string;
  mediaType: string;
  size: number;
}

export const defineBlob = (sequelize: Sequelize) =>
  sequelize.define<Blob>(
    'blob',
    {
      shopId: { type: DataTypes.UUID, primaryKey: true },
      hash: { type: DataTypes.TEXT, primaryKey: true },
      mediaType: { type: DataTypes.TEXT, allowNull: false },
      size: { type: DataTypes.INTEGER, allowNull: false },
    },
    { tableName: 'blobs' },
  );
