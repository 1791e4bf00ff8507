import { DataTypes, Model } from 'sequelize';
import type { InferAttributes, InferCreationAttributes } from 'sequelize';
import type { Assessment } from '@/hazard/types';
import type { Proof } from '@/shared/worksheet';
import { sequelize } from '../db';

/** One test for absence of voltage; never changed, never deleted. */
export class ProofRow extends Model<InferAttributes<ProofRow>, InferCreationAttributes<ProofRow>> {
  declare id: string;
  declare worksheetId: string;
  declare revision: number;
  declare proof: Proof;
  declare assessment: Assessment;
  declare byId: string;
  declare byName: string;
  declare at: Date;
}

ProofRow.init(
  {
    id: { type: DataTypes.UUID, primaryKey: true },
    worksheetId: { type: DataTypes.UUID, allowNull: false },
    revision: { type: DataTypes.INTEGER, allowNull: false },
    proof: { type: DataTypes.JSONB, allowNull: false },
    assessment: { type: DataTypes.JSONB, allowNull: false },
    byId: { type: DataTypes.UUID, allowNull: false },
    byName: { type: DataTypes.TEXT, allowNull: false },
    at: { type: DataTypes.DATE, allowNull: false },
  },
  { sequelize, tableName: 'proofs', underscored: true, timestamps: false },
);
