import { DataTypes, Model } from 'sequelize';
import type { InferAttributes, InferCreationAttributes } from 'sequelize';
import type { Meaning, Strokes } from '@/shared/record';
import type { Role } from '@/shared/user';
import { sequelize } from '../db';

/** One signature; never changed, never deleted. */
export class SignatureRow extends Model<
  InferAttributes<SignatureRow>,
  InferCreationAttributes<SignatureRow>
> {
  declare id: string;
  declare worksheetId: string;
  declare revision: number;
  declare meaning: Meaning;
  declare signerId: string;
  declare signerName: string;
  declare signerRole: Role;
  declare enteredById: string;
  declare contentHash: string;
  declare edition: string;
  declare assessmentHash: string;
  declare strokes: Strokes;
  declare strokesHash: string;
  declare method: 'pin' | 'device';
  declare deviceId: string | null;
  declare deviceSignature: string | null;
  declare signedAt: Date;
  declare receivedAt: Date;
}

// A new object a column: Sequelize writes the column's name into it.
const requiredText = () => ({ type: DataTypes.TEXT, allowNull: false });
const requiredId = () => ({ type: DataTypes.UUID, allowNull: false });

SignatureRow.init(
  {
    id: { type: DataTypes.UUID, primaryKey: true },
    worksheetId: requiredId(),
    revision: { type: DataTypes.INTEGER, allowNull: false },
    meaning: requiredText(),
    signerId: requiredId(),
    signerName: requiredText(),
    signerRole: requiredText(),
    enteredById: requiredId(),
    contentHash: requiredText(),
    edition: requiredText(),
    assessmentHash: requiredText(),
    strokes: { type: DataTypes.JSONB, allowNull: false },
    strokesHash: requiredText(),
    method: requiredText(),
    deviceId: DataTypes.UUID,
    deviceSignature: DataTypes.TEXT,
    signedAt: { type: DataTypes.DATE, allowNull: false },
    receivedAt: { type: DataTypes.DATE, allowNull: false },
  },
  { sequelize, tableName: 'signatures', underscored: true, timestamps: false },
);
