import { type CreationOptional, DataTypes, type InferAttributes, type InferCreationAttributes, Model } from "sequelize";
import { sequelize } from "../connection.server";

/** Which estimates a memo points at, in order. */
export class MemoEstimate extends Model<InferAttributes<MemoEstimate>, InferCreationAttributes<MemoEstimate>> {
  declare id: string;
  declare organisationId: string;
  declare memoId: string;
  declare estimateId: string;
  declare position: number;
  declare createdAt: CreationOptional<Date>;
  declare updatedAt: CreationOptional<Date>;
}

MemoEstimate.init(
  {
    id: { type: DataTypes.TEXT, primaryKey: true },
    organisationId: { type: DataTypes.TEXT, allowNull: false },
    memoId: { type: DataTypes.TEXT, allowNull: false },
    estimateId: { type: DataTypes.TEXT, allowNull: false },
    position: { type: DataTypes.INTEGER, allowNull: false },
    createdAt: DataTypes.DATE,
    updatedAt: DataTypes.DATE,
  },
  { sequelize, tableName: "memoEstimates", modelName: "MemoEstimate" },
);
