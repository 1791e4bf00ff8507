import { DataTypes, Model } from 'sequelize';
import type { CreationOptional, InferAttributes, InferCreationAttributes } from 'sequelize';
import type { Severity, Verdict } from '@/hazard/types';
import type { WorksheetState } from '@/shared/record';
import { sequelize } from '../db';

/** Codes of findings with the worst severity in which each was met. */
export type Severities = Record<string, Severity>;

/** The worksheet as it stands now: its state, and what lists and filters read. */
export class Worksheet extends Model<
  InferAttributes<Worksheet>,
  InferCreationAttributes<Worksheet>
> {
  declare id: string;
  declare number: string;
  declare state: CreationOptional<WorksheetState>;
  declare proved: CreationOptional<boolean>;
  declare revision: CreationOptional<number>;
  /** Counts the saves of the content: what If-Match names. */
  declare version: CreationOptional<number>;
  declare leadId: string;
  declare createdById: string;
  declare authorIds: CreationOptional<string[]>;
  declare crewIds: CreationOptional<string[]>;
  declare signedCrewIds: CreationOptional<string[]>;
  declare siteId: string | null;
  declare startsAt: Date | null;
  declare endsAt: Date | null;
  declare mode: string | null;
  declare task: string | null;
  declare system: string | null;
  declare circuitVolts: number | null;
  declare area: CreationOptional<string>;
  declare equipment: CreationOptional<string>;
  declare verdict: CreationOptional<Verdict>;
  declare stopCount: CreationOptional<number>;
  declare openCount: CreationOptional<number>;
  declare cautionCount: CreationOptional<number>;
  declare findingCodes: CreationOptional<string[]>;
  declare metCodes: CreationOptional<string[]>;
  declare standing: CreationOptional<Severities>;
  declare met: CreationOptional<Severities>;
  declare reason: string | null;
  declare reasonById: string | null;
  declare reasonAt: Date | null;
  declare searchDocument: CreationOptional<string>;
  declare createdAt: Date;
  declare updatedAt: Date;
}

// A new object a column: Sequelize writes the column's name into it.
const text = () => ({ type: DataTypes.TEXT });
const requiredText = () => ({ type: DataTypes.TEXT, allowNull: false, defaultValue: '' });
const count = () => ({ type: DataTypes.INTEGER, allowNull: false, defaultValue: 0 });
const ids = () => ({ type: DataTypes.ARRAY(DataTypes.UUID), allowNull: false, defaultValue: [] });
const severities = () => ({ type: DataTypes.JSONB, allowNull: false, defaultValue: {} });
const codes = () => ({ type: DataTypes.ARRAY(DataTypes.TEXT), allowNull: false, defaultValue: [] });

Worksheet.init(
  {
    id: { type: DataTypes.UUID, primaryKey: true },
    number: { type: DataTypes.TEXT, allowNull: false },
    state: { type: DataTypes.TEXT, allowNull: false, defaultValue: 'draft' },
    proved: { type: DataTypes.BOOLEAN, allowNull: false, defaultValue: false },
    revision: { type: DataTypes.INTEGER, allowNull: false, defaultValue: 1 },
    version: { type: DataTypes.INTEGER, allowNull: false, defaultValue: 1 },
    leadId: { type: DataTypes.UUID, allowNull: false },
    createdById: { type: DataTypes.UUID, allowNull: false },
    authorIds: ids(),
    crewIds: ids(),
    signedCrewIds: ids(),
    siteId: DataTypes.UUID,
    startsAt: DataTypes.DATE,
    endsAt: DataTypes.DATE,
    mode: text(),
    task: text(),
    system: text(),
    circuitVolts: DataTypes.DOUBLE,
    area: requiredText(),
    equipment: requiredText(),
    verdict: { type: DataTypes.TEXT, allowNull: false, defaultValue: 'open' },
    stopCount: count(),
    openCount: count(),
    cautionCount: count(),
    findingCodes: codes(),
    metCodes: codes(),
    standing: severities(),
    met: severities(),
    reason: text(),
    reasonById: DataTypes.UUID,
    reasonAt: DataTypes.DATE,
    searchDocument: requiredText(),
    createdAt: { type: DataTypes.DATE, allowNull: false },
    updatedAt: { type: DataTypes.DATE, allowNull: false },
  },
  // The services write both times from the one clock.
  { sequelize, tableName: 'worksheets', underscored: true, timestamps: false },
);
