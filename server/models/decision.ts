import { DataTypes } from 'sequelize';
import type { InferAttributes, InferCreationAttributes, Model, Sequelize } from 'sequelize';
import type { z } from 'zod';
import type { decision } from '../../shared/api/drawings';

export type DecisionAct = z.infer<typeof decision>['act'];

export interface Decision extends Model<InferAttributes<Decision>, InferCreationAttributes<Decision>> {
  id: string;
  shopId: string;
  revisionId: string;
  act: DecisionAct;
  personId: string;
  at: Date;
  reason: string | null;
  contentHash: string | null;
}

export const defineDecision = (sequelize: Sequelize) =>
  sequelize.define<Decision>(
    'decision',
    {
      id: { type: DataTypes.UUID, primaryKey: true },
      shopId: { type: DataTypes.UUID, allowNull: false },
      revisionId: { type: DataTypes.UUID, allowNull: false },
      act: { type: DataTypes.TEXT, allowNull: false },
      personId: { type: DataTypes.UUID, allowNull: false },
      at: { type: DataTypes.DATE, allowNull: false },
      reason: { type: DataTypes.TEXT },
      contentHash: { type: DataTypes.TEXT },
    },
    { tableName: 'decisions' },
  );
