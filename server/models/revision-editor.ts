import { DataTypes } from 'sequelize';
import type { InferAttributes, InferCreationAttributes, Model, Sequelize } from 'sequelize';

/** Everybody who ever saved a value of a revision: for them it is their own. */
export interface RevisionEditor extends Model<
  InferAttributes<RevisionEditor>,
  InferCreationAttributes<RevisionEditor>
> {
  shopId: string;
  revisionId: string;
  personId: string;
}

export const defineRevisionEditor = (sequelize: Sequelize) =>
  sequelize.define<RevisionEditor>(
    'revisionEditor',
    {
      shopId: { type: DataTypes.UUID, primaryKey: true },
      revisionId: { type: DataTypes.UUID, primaryKey: true },
      personId: { type: DataTypes.UUID, primaryKey: true },
    },
    { tableName: 'revision_editors' },
  );
