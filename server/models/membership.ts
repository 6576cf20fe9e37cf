import { DataTypes } from 'sequelize';
import type { InferAttributes, InferCreationAttributes, Model, Sequelize } from 'sequelize';
import type { Role } from '../../shared/api/session';

export interface Membership extends Model<InferAttributes<Membership>, InferCreationAttributes<Membership>> {
  shopId: string;
  personId: string;
  roles: Role[];
}

export const defineMembership = (sequelize: Sequelize) =>
  sequelize.define<Membership>(
    'membership',
    {
      shopId: { type: DataTypes.UUID, primaryKey: true },
      personId: { type: DataTypes.UUID, primaryKey: true },
      roles: { type: DataTypes.ARRAY(DataTypes.TEXT), allowNull: false },
    },
    { tableName: 'memberships' },
  );
