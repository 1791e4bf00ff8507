import { DataTypes, Model } from 'sequelize';
import type { CreationOptional, InferAttributes, InferCreationAttributes } from 'sequelize';
import { sequelize } from '../db';

/** What an event is about: each subject has a chain of its own. */
export type SubjectType = 'worksheet' | 'user' | 'site' | 'rubber-goods' | 'device';

export class Event extends Model<InferAttributes<Event>, InferCreationAttributes<Event>> {
  /** A bigint, which the driver hands over as text. */
  declare seq: CreationOptional<string>;
  declare subjectType: SubjectType;
  declare subjectId: string;
  declare revision: number | null;
  declare type: string;
  declare actorId: string | null;
  declare enteredById: string | null;
  declare at: Date;
  declare payload: Record<string, unknown>;
  declare hash: string;
  declare previousHash: string | null;
}

Event.init(
  {
    seq: { type: DataTypes.BIGINT, primaryKey: true, autoIncrement: true },
    subjectType: { type: DataTypes.TEXT, allowNull: false },
    subjectId: { type: DataTypes.UUID, allowNull: false },
    revision: DataTypes.INTEGER,
    type: { type: DataTypes.TEXT, allowNull: false },
    actorId: DataTypes.UUID,
    enteredById: DataTypes.UUID,
    at: { type: DataTypes.DATE, allowNull: false },
    payload: { type: DataTypes.JSONB, allowNull: false },
    hash: { type: DataTypes.TEXT, allowNull: false },
    previousHash: DataTypes.TEXT,
  },
  { sequelize, tableName: 'events', underscored: true, timestamps: false },
);
