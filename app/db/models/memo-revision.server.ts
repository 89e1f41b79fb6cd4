import { type CreationOptional, DataTypes, type InferAttributes, type InferCreationAttributes, Model } from "sequelize";
import { sequelize } from "../connection.server";
import type { MemoDocument } from "~/memo/document";
import type { MemoPurpose } from "~/memo/purposes";

/** Frozen at issue: text, figures, numbers and the PDF itself. */
export class MemoRevision extends Model<InferAttributes<MemoRevision>, InferCreationAttributes<MemoRevision>> {
  declare id: string;
  declare organisationId: string;
  declare memoId: string;
  /** From 1; `label` is how the organisation writes it. */
  declare sequence: number;
  declare label: string;
  declare purpose: MemoPurpose;
  declare document: MemoDocument;
  declare stamp: string;
  declare pdf: Buffer;
  declare pdfSha256: string;
  declare issuedBy: string;
  declare checkerId: string | null;
  declare issuedAt: Date;
  declare createdAt: CreationOptional<Date>;
  declare updatedAt: CreationOptional<Date>;
}

MemoRevision.init(
  {
    id: { type: DataTypes.TEXT, primaryKey: true },
    organisationId: { type: DataTypes.TEXT, allowNull: false },
    memoId: { type: DataTypes.TEXT, allowNull: false },
    sequence: { type: DataTypes.INTEGER, allowNull: false },
    label: { type: DataTypes.TEXT, allowNull: false },
    purpose: { type: DataTypes.TEXT, allowNull: false },
    document: { type: DataTypes.JSON, allowNull: false },
    stamp: { type: DataTypes.TEXT, allowNull: false },
    pdf: { type: DataTypes.BLOB, allowNull: false },
    pdfSha256: { type: DataTypes.TEXT, allowNull: false },
    issuedBy: { type: DataTypes.TEXT, allowNull: false },
    checkerId: { type: DataTypes.TEXT, allowNull: true },
    issuedAt: { type: DataTypes.DATE, allowNull: false },
    createdAt: DataTypes.DATE,
    updatedAt: DataTypes.DATE,
  },
  { sequelize, tableName: "memoRevisions", modelName: "MemoRevision" },
);
