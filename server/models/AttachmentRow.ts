import { DataTypes, Model } from 'sequelize';
import type { InferAttributes, InferCreationAttributes } from 'sequelize';
import type { Attachment } from '@/shared/record';
import { sequelize } from '../db';

/** A photo; its bytes lie in the storage under its id. */
export class AttachmentRow extends Model<
  InferAttributes<AttachmentRow>,
  InferCreationAttributes<AttachmentRow>
> {
  declare id: string;
  declare worksheetId: string;
  declare revision: number;
  declare section: Attachment['section'];
  declare caption: string;
  declare type: string;
  declare byteCount: number;
  declare sha256: string;
  declare receivedSha256: string;
  declare createdById: string;
  declare createdAt: Date;
}

// A new object a column: Sequelize writes the column's name into it.
const requiredText = () => ({ type: DataTypes.TEXT, allowNull: false });

AttachmentRow.init(
  {
    id: { type: DataTypes.UUID, primaryKey: true },
    worksheetId: { type: DataTypes.UUID, allowNull: false },
    revision: { type: DataTypes.INTEGER, allowNull: false },
    section: requiredText(),
    caption: requiredText(),
    type: requiredText(),
    byteCount: { type: DataTypes.INTEGER, allowNull: false },
    // Sequelize would make it sha_256.
    sha256: { ...requiredText(), field: 'sha256' },
    receivedSha256: { ...requiredText(), field: 'received_sha256' },
    createdById: { type: DataTypes.UUID, allowNull: false },
    createdAt: { type: DataTypes.DATE, allowNull: false },
  },
  { sequelize, tableName: 'attachments', underscored: true, timestamps: false },
);
