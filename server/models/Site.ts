import { DataTypes, Model } from 'sequelize';
import type { CreationOptional, InferAttributes, InferCreationAttributes } from 'sequelize';
import type { Site as SiteRecord } from '@/shared/register';
import { sequelize } from '../db';

export class Site extends Model<InferAttributes<Site>, InferCreationAttributes<Site>> {
  declare id: string;
  declare name: string;
  declare timeZone: string;
  declare address: CreationOptional<string>;
  declare systems: CreationOptional<SiteRecord['systems']>;
  declare panels: CreationOptional<SiteRecord['panels']>;
  declare emergency: CreationOptional<SiteRecord['emergency']>;
  declare deskToTell: CreationOptional<string>;
  declare retiredAt: CreationOptional<Date | null>;
  declare createdAt: Date;
  declare updatedAt: Date;
}

Site.init(
  {
    id: { type: DataTypes.UUID, primaryKey: true },
    name: { type: DataTypes.TEXT, allowNull: false },
    timeZone: { type: DataTypes.TEXT, allowNull: false },
    address: { type: DataTypes.TEXT, allowNull: false, defaultValue: '' },
    systems: { type: DataTypes.JSONB, allowNull: false, defaultValue: [] },
    panels: { type: DataTypes.JSONB, allowNull: false, defaultValue: [] },
    emergency: { type: DataTypes.JSONB, allowNull: false, defaultValue: {} },
    deskToTell: { type: DataTypes.TEXT, allowNull: false, defaultValue: '' },
    retiredAt: DataTypes.DATE,
    createdAt: { type: DataTypes.DATE, allowNull: false },
    updatedAt: { type: DataTypes.DATE, allowNull: false },
  },
  { sequelize, tableName: 'sites', underscored: true, timestamps: false },
);
