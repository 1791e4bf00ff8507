import { DataTypes, Model } from 'sequelize';
import type { CreationOptional, InferAttributes, InferCreationAttributes } from 'sequelize';
import type { GloveClass } from '@/hazard/enumerations';
import type { RETIRED_BECAUSE, RubberGoodsKind } from '@/shared/register';
import { sequelize } from '../db';

export class RubberGoods extends Model<
  InferAttributes<RubberGoods>,
  InferCreationAttributes<RubberGoods>
> {
  declare id: string;
  declare siteId: string;
  declare kind: RubberGoodsKind;
  declare gloveClass: GloveClass;
  declare serial: string;
  /** A double from before serials were unique, until the office corrects it. */
  declare serialRepeats: CreationOptional<boolean>;
  declare size: CreationOptional<string>;
  declare issuedOn: CreationOptional<string | null>;
  declare retiredAt: CreationOptional<Date | null>;
  declare retiredBecause: CreationOptional<(typeof RETIRED_BECAUSE)[number] | null>;
  declare createdAt: Date;
  declare updatedAt: Date;
}

RubberGoods.init(
  {
    id: { type: DataTypes.UUID, primaryKey: true },
    siteId: { type: DataTypes.UUID, allowNull: false },
    kind: { type: DataTypes.TEXT, allowNull: false },
    gloveClass: { type: DataTypes.TEXT, allowNull: false },
    serial: { type: DataTypes.TEXT, allowNull: false },
    serialRepeats: { type: DataTypes.BOOLEAN, allowNull: false, defaultValue: false },
    size: { type: DataTypes.TEXT, allowNull: false, defaultValue: '' },
    issuedOn: DataTypes.DATEONLY,
    retiredAt: DataTypes.DATE,
    retiredBecause: DataTypes.TEXT,
    createdAt: { type: DataTypes.DATE, allowNull: false },
    updatedAt: { type: DataTypes.DATE, allowNull: false },
  },
  { sequelize, tableName: 'rubber_goods', underscored: true, timestamps: false },
);
