import { type CreationOptional, DataTypes, type InferAttributes, type InferCreationAttributes, Model } from "sequelize";
import { sequelize } from "../connection.server";
import type { ChosenThresholds } from "~/quality/thresholds";

/** What a project has in place of the default thresholds. A version is never edited: a change is the next version. */
export class ThresholdSheet extends Model<InferAttributes<ThresholdSheet>, InferCreationAttributes<ThresholdSheet>> {
  declare id: string;
  declare organisationId: string;
  declare projectId: string;
  declare version: number;
  declare thresholds: ChosenThresholds;
  declare createdBy: string;
  declare createdAt: CreationOptional<Date>;
  declare updatedAt: CreationOptional<Date>;
}

ThresholdSheet.init(
  {
    id: { type: DataTypes.TEXT, primaryKey: true },
    organisationId: { type: DataTypes.TEXT, allowNull: false },
    projectId: { type: DataTypes.TEXT, allowNull: false },
    version: { type: DataTypes.INTEGER, allowNull: false },
    thresholds: { type: DataTypes.JSON, allowNull: false },
    createdBy: { type: DataTypes.TEXT, allowNull: false },
    createdAt: DataTypes.DATE,
    updatedAt: DataTypes.DATE,
  },
  { sequelize, tableName: "thresholdSheets", modelName: "ThresholdSheet" },
);
