import { DataTypes, Model } from 'sequelize';
import type { CreationOptional, InferAttributes, InferCreationAttributes } from 'sequelize';
import { sequelize } from '../db';

/** A phone or tablet that may sign without signal. */
export class Device extends Model<InferAttributes<Device>, InferCreationAttributes<Device>> {
  declare id: string;
  declare userId: string;
  declare publicKey: { kty: 'EC'; crv: 'P-256'; x: string; y: string };
  declare label: string;
  declare createdAt: Date;
  declare lastUsedAt: CreationOptional<Date | null>;
  declare revokedAt: CreationOptional<Date | null>;
}

Device.init(
  {
    id: { type: DataTypes.UUID, primaryKey: true },
    userId: { type: DataTypes.UUID, allowNull: false },
    publicKey: { type: DataTypes.JSONB, allowNull: false },
    label: { type: DataTypes.TEXT, allowNull: false },
    createdAt: { type: DataTypes.DATE, allowNull: false },
    lastUsedAt: DataTypes.DATE,
    revokedAt: DataTypes.DATE,
  },
  { sequelize, tableName: 'devices', underscored: true, timestamps: false },
);
