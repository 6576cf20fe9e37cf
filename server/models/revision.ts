import { DataTypes } from 'sequelize';
import type { CreationOptional, InferAttributes, InferCreationAttributes, Model, Sequelize } from 'sequelize';
import type { RevisionState, SheetSettings } from '../../shared/api/drawings';
import type { CheckFinding, Sheet } from '../../shared/drawing/sheet';
import type { Part } from '../../shared/part/part';
import type { Problem } from '../../shared/problem';
import type { Capacity, Fault, Route } from '../../shared/route/route';
import type { Scheme } from '../../shared/scheme/scheme';
import type { EvaluatedParameters, TypedValues } from '../../shared/template/template';

/**
 * A full snapshot: what was typed, what it came to, and the engine's results as JSON. The results are the last good
 * ones, null while the values have never been right. Only a draft changes; the database holds that.
 */
export interface Revision extends Model<InferAttributes<Revision>, InferCreationAttributes<Revision>> {
  id: string;
  shopId: string;
  drawingId: string;
  /** 1, 2, 3 … for A, B, C … */
  sequence: number;
  letter: string;
  state: RevisionState;
  trial: CreationOptional<boolean>;
  returned: CreationOptional<boolean>;
  version: CreationOptional<number>;
  change: string;
  title: string;
  note: string;
  template: string;
  templateHash: string;
  engine: string;
  entryUnit: 'mm' | 'in';
  settings: SheetSettings;
  typed: TypedValues;
  evaluated: EvaluatedParameters;
  problems: readonly Problem[];
  registerId: string;
  schemaVersion: CreationOptional<number>;
  part: CreationOptional<Part | null>;
  scheme: CreationOptional<Scheme | null>;
  route: CreationOptional<Route | null>;
  capacity: CreationOptional<Capacity | null>;
  faults: CreationOptional<readonly Fault[] | null>;
  sheet: CreationOptional<Sheet | null>;
  findings: CreationOptional<readonly CheckFinding[] | null>;
  contentHash: CreationOptional<string | null>;
  svgHash: CreationOptional<string | null>;
  pdfHash: CreationOptional<string | null>;
  savedBy: string;
  savedAt: Date;
  changedAt: Date;
  drawnBy: CreationOptional<string | null>;
  drawnAt: CreationOptional<Date | null>;
  checkedBy: CreationOptional<string | null>;
  checkedAt: CreationOptional<Date | null>;
  noSecondCheck: CreationOptional<boolean>;
}

export const defineRevision = (sequelize: Sequelize) =>
  sequelize.define<Revision>(
    'revision',
    {
      id: { type: DataTypes.UUID, primaryKey: true },
      shopId: { type: DataTypes.UUID, allowNull: false },
      drawingId: { type: DataTypes.UUID, allowNull: false },
      sequence: { type: DataTypes.INTEGER, allowNull: false },
      letter: { type: DataTypes.TEXT, allowNull: false },
      state: { type: DataTypes.TEXT, allowNull: false },
      trial: { type: DataTypes.BOOLEAN, defaultValue: false },
      returned: { type: DataTypes.BOOLEAN, defaultValue: false },
      version: { type: DataTypes.INTEGER, defaultValue: 0 },
      change: { type: DataTypes.TEXT, allowNull: false },
      title: { type: DataTypes.TEXT, allowNull: false },
      note: { type: DataTypes.TEXT, allowNull: false },
      template: { type: DataTypes.TEXT, allowNull: false },
      templateHash: { type: DataTypes.TEXT, allowNull: false },
      engine: { type: DataTypes.TEXT, allowNull: false },
      entryUnit: { type: DataTypes.TEXT, allowNull: false },
      settings: { type: DataTypes.JSONB, allowNull: false },
      typed: { type: DataTypes.JSONB, allowNull: false },
      evaluated: { type: DataTypes.JSONB, allowNull: false },
      problems: { type: DataTypes.JSONB, allowNull: false },
      registerId: { type: DataTypes.UUID, allowNull: false },
      schemaVersion: { type: DataTypes.INTEGER, defaultValue: 1 },
      part: { type: DataTypes.JSONB },
      scheme: { type: DataTypes.JSONB },
      route: { type: DataTypes.JSONB },
      capacity: { type: DataTypes.JSONB },
      faults: { type: DataTypes.JSONB },
      sheet: { type: DataTypes.JSONB },
      findings: { type: DataTypes.JSONB },
      contentHash: { type: DataTypes.TEXT },
      svgHash: { type: DataTypes.TEXT },
      pdfHash: { type: DataTypes.TEXT },
      savedBy: { type: DataTypes.UUID, allowNull: false },
      savedAt: { type: DataTypes.DATE, allowNull: false },
      changedAt: { type: DataTypes.DATE, allowNull: false },
      drawnBy: { type: DataTypes.UUID },
      drawnAt: { type: DataTypes.DATE },
      checkedBy: { type: DataTypes.UUID },
      checkedAt: { type: DataTypes.DATE },
      noSecondCheck: { type: DataTypes.BOOLEAN, defaultValue: false },
    },
    { tableName: 'revisions' },
  );
