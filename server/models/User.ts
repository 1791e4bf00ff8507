import { DataTypes, Model } from 'sequelize';
import type { CreationOptional, InferAttributes, InferCreationAttributes } from 'sequelize';
import type { Locale, Role, ThemeChoice, Units } from '@/shared/user';
import { sequelize } from '../db';

export class User extends Model<InferAttributes<User>, InferCreationAttributes<User>> {
  declare id: string;
  declare name: string;
  declare email: string;
  declare role: Role;
  declare qualifiedThrough: CreationOptional<string | null>;
  declare locale: CreationOptional<Locale>;
  declare units: CreationOptional<Units>;
  declare theme: CreationOptional<ThemeChoice>;
  declare passwordHash: CreationOptional<string | null>;
  declare pinHash: CreationOptional<string | null>;
  declare sessionEpoch: CreationOptional<number>;
  /** A demo account has a published password: it never meets anything but loopback. */
  declare demo: CreationOptional<boolean>;
  declare invitedAt: CreationOptional<Date | null>;
  declare retiredAt: CreationOptional<Date | null>;
  declare createdAt: Date;
  declare updatedAt: Date;
}

User.init(
  {
    id: { type: DataTypes.UUID, primaryKey: true },
    name: { type: DataTypes.TEXT, allowNull: false },
    email: { type: DataTypes.TEXT, allowNull: false },
    role: { type: DataTypes.TEXT, allowNull: false },
    qualifiedThrough: DataTypes.DATEONLY,
    locale: { type: DataTypes.TEXT, allowNull: false, defaultValue: 'en-US' },
    units: { type: DataTypes.TEXT, allowNull: false, defaultValue: 'feet' },
    theme: { type: DataTypes.TEXT, allowNull: false, defaultValue: 'system' },
    passwordHash: DataTypes.TEXT,
    pinHash: DataTypes.TEXT,
    sessionEpoch: { type: DataTypes.INTEGER, allowNull: false, defaultValue: 0 },
    demo: { type: DataTypes.BOOLEAN, allowNull: false, defaultValue: false },
    invitedAt: DataTypes.DATE,
    retiredAt: DataTypes.DATE,
    createdAt: { type: DataTypes.DATE, allowNull: false },
    updatedAt: { type: DataTypes.DATE, allowNull: false },
  },
  { sequelize, tableName: 'users', underscored: true, timestamps: false },
);
