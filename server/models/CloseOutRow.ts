import { DataTypes, Model } from 'sequelize';
import type { InferAttributes, InferCreationAttributes } from 'sequelize';
import type { Assessment } from '@/hazard/types';
import type { CloseOut } from '@/shared/worksheet';
import { sequelize } from '../db';

/** How the job ended; never changed, never deleted. */
export class CloseOutRow extends Model<
  InferAttributes<CloseOutRow>,
  InferCreationAttributes<CloseOutRow>
> {
  declare id: string;
  declare worksheetId: string;
  declare revision: number;
  declare closeOut: CloseOut;
  declare assessment: Assessment;
  declare byId: string;
  declare byName: string;
  declare at: Date;
}

CloseOutRow.init(
  {
    id: { type: DataTypes.UUID, primaryKey: true },
    worksheetId: { type: DataTypes.UUID, allowNull: false },
    revision: { type: DataTypes.INTEGER, allowNull: false },
    closeOut: { type: DataTypes.JSONB, allowNull: false },
    assessment: { type: DataTypes.JSONB, allowNull: false },
    byId: { type: DataTypes.UUID, allowNull: false },
    byName: { type: DataTypes.TEXT, allowNull: false },
    at: { type: DataTypes.DATE, allowNull: false },
  },
  { sequelize, tableName: 'close_outs', underscored: true, timestamps: false },
);
