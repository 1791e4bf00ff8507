import { DataTypes, Model } from 'sequelize';
import type { CreationOptional, InferAttributes, InferCreationAttributes } from 'sequelize';
import { sequelize } from '../db';

/** One night's seal over the events since the seal before. */
export class Seal extends Model<InferAttributes<Seal>, InferCreationAttributes<Seal>> {
  declare id: CreationOptional<string>;
  declare firstSeq: string;
  declare lastSeq: string;
  declare count: number;
  declare eventsHash: string;
  declare hash: string;
  declare previousHash: string | null;
  declare sealedAt: Date;
}

Seal.init(
  {
    id: { type: DataTypes.BIGINT, primaryKey: true, autoIncrement: true },
    firstSeq: { type: DataTypes.BIGINT, allowNull: false },
    lastSeq: { type: DataTypes.BIGINT, allowNull: false },
    count: { type: DataTypes.INTEGER, allowNull: false },
    eventsHash: { type: DataTypes.TEXT, allowNull: false },
    hash: { type: DataTypes.TEXT, allowNull: false },
    previousHash: DataTypes.TEXT,
    sealedAt: { type: DataTypes.DATE, allowNull: false },
  },
  { sequelize, tableName: 'seals', underscored: true, timestamps: false },
);
