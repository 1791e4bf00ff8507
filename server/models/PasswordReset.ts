import { DataTypes, Model } from 'sequelize';
import type { CreationOptional, InferAttributes, InferCreationAttributes } from 'sequelize';
import { sequelize } from '../db';

/** A link to choose a password: with an invitation also the first signing PIN. */
export class PasswordReset extends Model<
  InferAttributes<PasswordReset>,
  InferCreationAttributes<PasswordReset>
> {
  declare tokenHash: string;
  declare userId: string;
  declare kind: 'reset' | 'invitation';
  declare expiresAt: Date;
  declare usedAt: CreationOptional<Date | null>;
  declare createdAt: Date;
}

PasswordReset.init(
  {
    tokenHash: { type: DataTypes.TEXT, primaryKey: true },
    userId: { type: DataTypes.UUID, allowNull: false },
    kind: { type: DataTypes.TEXT, allowNull: false },
    expiresAt: { type: DataTypes.DATE, allowNull: false },
    usedAt: DataTypes.DATE,
    createdAt: { type: DataTypes.DATE, allowNull: false },
  },
  { sequelize, tableName: 'password_resets', underscored: true, timestamps: false },
);
