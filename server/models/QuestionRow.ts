import { DataTypes, Model } from 'sequelize';
import type { InferAttributes, InferCreationAttributes } from 'sequelize';
import { sequelize } from '../db';

/** A question of the crew, and the lead's answer once given. */
export class QuestionRow extends Model<
  InferAttributes<QuestionRow>,
  InferCreationAttributes<QuestionRow>
> {
  declare id: string;
  declare worksheetId: string;
  declare revision: number;
  declare text: string;
  declare askedById: string;
  declare askedAt: Date;
  declare answerId: string | null;
  declare answer: string | null;
  declare answeredById: string | null;
  declare answeredAt: Date | null;
}

QuestionRow.init(
  {
    id: { type: DataTypes.UUID, primaryKey: true },
    worksheetId: { type: DataTypes.UUID, allowNull: false },
    revision: { type: DataTypes.INTEGER, allowNull: false },
    text: { type: DataTypes.TEXT, allowNull: false },
    askedById: { type: DataTypes.UUID, allowNull: false },
    askedAt: { type: DataTypes.DATE, allowNull: false },
    answerId: DataTypes.UUID,
    answer: DataTypes.TEXT,
    answeredById: DataTypes.UUID,
    answeredAt: DataTypes.DATE,
  },
  { sequelize, tableName: 'questions', underscored: true, timestamps: false },
);
