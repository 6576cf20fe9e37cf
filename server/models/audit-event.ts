import { DataTypes } from 'sequelize';
import type { InferAttributes, InferCreationAttributes, Model, Sequelize } from 'sequelize';

export interface AuditEvent extends Model<InferAttributes<AuditEvent>, InferCreationAttributes<AuditEvent>> {
  id: string;
  shopId: string;
  drawingId: string | null;
  revisionId: string | null;
  personId: string | null;
  act: string;
  detail: Record<string, unknown>;
  requestId: string | null;
  at: Date;
}

export const defineAuditEvent = (sequelize: Sequelize) =>
  sequelize.define<AuditEvent>(
    'auditEvent',
    {
      id: { type: DataTypes.UUID, primaryKey: true },
      shopId: { type: DataTypes.UUID, allowNull: false },
      drawingId: { type: DataTypes.UUID },
      revisionId: { type: DataTypes.UUID },
      personId: { type: DataTypes.UUID },
      act: { type: DataTypes.TEXT, allowNull: false },
      detail: { type: DataTypes.JSONB, allowNull: false },
      requestId: { type: DataTypes.TEXT },
      at: { type: DataTypes.DATE, allowNull: false },
    },
    { tableName: 'audit_events' },
  );
