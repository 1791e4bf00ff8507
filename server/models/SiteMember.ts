import { DataTypes, Model } from 'sequelize';
import type { InferAttributes, InferCreationAttributes } from 'sequelize';
import { sequelize } from '../db';

/** Who belongs to which site. */
export class SiteMember extends Model<
  InferAttributes<SiteMember>,
  InferCreationAttributes<SiteMember>
> {
  declare siteId: string;
  declare userId: string;
}

SiteMember.init(
  {
    siteId: { type: DataTypes.UUID, primaryKey: true },
    userId: { type: DataTypes.UUID, primaryKey: true },
  },
  { sequelize, tableName: 'site_members', underscored: true, timestamps: false },
);
