import { type CreationOptional, DataTypes, type InferAttributes, type InferCreationAttributes, Model } from "sequelize";
import { sequelize } from "../connection.server";
import type { MemoPurpose } from "~/memo/purposes";

/** The working draft; what was issued stands in `memoRevisions`. */
export class Memo extends Model<InferAttributes<Memo>, InferCreationAttributes<Memo>> {
  declare id: string;
  declare organisationId: string;
  declare projectId: string;
  declare number: number;
  declare title: string;
  declare question: string;
  /** The originator's own paragraph; empty means the drafted one. */
  declare findings: string;
  declare purpose: MemoPurpose;
  declare originatorId: string;
  declare checkerId: string | null;
  declare checkedAt: Date | null;
  /** Hash of what the checker signed; any change voids the signature. */
  declare checkedContent: string | null;
  declare createdAt: CreationOptional<Date>;
  declare updatedAt: CreationOptional<Date>;
}

Memo.init(
  {
    id: { type: DataTypes.TEXT, primaryKey: true },
    organisationId: { type: DataTypes.TEXT, allowNull: false },
    projectId: { type: DataTypes.TEXT, allowNull: false },
    number: { type: DataTypes.INTEGER, allowNull: false },
    title: { type: DataTypes.TEXT, allowNull: false, validate: { len: [1, 160] } },
    question: { type: DataTypes.TEXT, allowNull: false },
    findings: { type: DataTypes.TEXT, allowNull: false },
    purpose: { type: DataTypes.TEXT, allowNull: false },
    originatorId: { type: DataTypes.TEXT, allowNull: false },
    checkerId: { type: DataTypes.TEXT, allowNull: true },
    checkedAt: { type: DataTypes.DATE, allowNull: true },
    checkedContent: { type: DataTypes.TEXT, allowNull: true },
    createdAt: DataTypes.DATE,
    updatedAt: DataTypes.DATE,
  },
  { sequelize, tableName: "memos", modelName: "Memo" },
);
