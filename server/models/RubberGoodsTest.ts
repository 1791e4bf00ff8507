import { DataTypes, Model } from 'sequelize';
import type { CreationOptional, InferAttributes, InferCreationAttributes } from 'sequelize';
import { v7 } from 'uuid';
import { sequelize } from '../db';

/** One electrical test of one item, in the order in which they were entered. */
export class RubberGoodsTest extends Model<
  InferAttributes<RubberGoodsTest>,
  InferCreationAttributes<RubberGoodsTest>
> {
  declare rubberGoodsId: string;
  declare id: CreationOptional<string>;
  declare position: number;
  declare testedOn: string;
  declare passed: boolean;
  declare laboratory: CreationOptional<string | null>;
}

RubberGoodsTest.init(
  {
    rubberGoodsId: { type: DataTypes.UUID, primaryKey: true },
    id: { type: DataTypes.UUID, allowNull: false, defaultValue: () => v7() },
    position: { type: DataTypes.INTEGER, primaryKey: true },
    testedOn: { type: DataTypes.DATEONLY, allowNull: false },
    passed: { type: DataTypes.BOOLEAN, allowNull: false },
    laboratory: DataTypes.TEXT,
  },
  { sequelize, tableName: 'rubber_goods_tests', underscored: true, timestamps: false },
);
