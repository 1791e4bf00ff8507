import { DataTypes, Model } from 'sequelize';
import type { CreationOptional, InferAttributes, InferCreationAttributes } from 'sequelize';
import type { Assessment } from '@/hazard/types';
import type { WorksheetContent } from '@/shared/worksheet';
import { sequelize } from '../db';

/** A stop that a saved assessment held. */
export interface SeenStop {
  code: string;
  path: string;
}

/** The content of one revision; from its first signature on the database refuses any change. */
export class WorksheetRevision extends Model<
  InferAttributes<WorksheetRevision>,
  InferCreationAttributes<WorksheetRevision>
> {
  declare worksheetId: string;
  declare revision: number;
  declare content: WorksheetContent;
  declare contentHash: string;
  declare edition: string;
  /** As it stood when the lead signed; null before. */
  declare assessment: Assessment | null;
  declare stopsSeen: CreationOptional<SeenStop[]>;
  declare createdById: string;
  declare createdAt: Date;
  declare updatedAt: Date;
}

WorksheetRevision.init(
  {
    worksheetId: { type: DataTypes.UUID, primaryKey: true },
    revision: { type: DataTypes.INTEGER, primaryKey: true },
    content: { type: DataTypes.JSONB, allowNull: false },
    contentHash: { type: DataTypes.TEXT, allowNull: false },
    edition: { type: DataTypes.TEXT, allowNull: false },
    assessment: DataTypes.JSONB,
    stopsSeen: { type: DataTypes.JSONB, allowNull: false, defaultValue: [] },
    createdById: { type: DataTypes.UUID, allowNull: false },
    createdAt: { type: DataTypes.DATE, allowNull: false },
    updatedAt: { type: DataTypes.DATE, allowNull: false },
  },
  { sequelize, tableName: 'worksheet_revisions', underscored: true, timestamps: false },
);
