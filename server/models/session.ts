import { DataTypes } from 'sequelize';
import type { CreationOptional, InferAttributes, InferCreationAttributes, Model, Sequelize } from 'sequelize';

/** A refresh token ever given out; tokens of one sign-in share the family. */
export interface Session extends Model<InferAttributes<Session>, InferCreationAttributes<Session>> {
  id: string;
  familyId: string;
  personId: string;
  tokenHash: string;
  expiresAt: Date;
  replacedAt: CreationOptional<Date | null>;
  endedAt: CreationOptional<Date | null>;
}

export const defineSession = (sequelize: Sequelize) =>
  sequelize.define<Session>(
    'session',
    {
      id: { type: DataTypes.UUID, primaryKey: true },
      familyId: { type: DataTypes.UUID, allowNull: false },
      personId: { type: DataTypes.UUID, allowNull: false },
      tokenHash: { type: DataTypes.TEXT, allowNull: false },
      expiresAt: { type: DataTypes.DATE, allowNull: false },
      replacedAt: { type: DataTypes.DATE },
      endedAt: { type: DataTypes.DATE },
    },
    { tableName: 'sessions' },
  );
