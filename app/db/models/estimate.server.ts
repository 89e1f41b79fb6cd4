import { type CreationOptional, DataTypes, type InferAttributes, type InferCreationAttributes, Model } from "sequelize";
import { sequelize } from "../connection.server";
import type { RunInputs } from "~/estimates/inputs-register";
import type { ScenarioProblem } from "~/ocean/scenario";

/** One cell of the ledger. Its response is found by input hash and engine version, so an edit taken back makes it current again. */
export class Estimate extends Model<InferAttributes<Estimate>, InferCreationAttributes<Estimate>> {
  declare id: string;
  declare organisationId: string;
  declare projectId: string;
  declare number: number;
  declare studyBoxId: string;
  declare stormId: string;
  declare waterColumnId: string;
  declare methodSheetId: string;
  declare state: "queued" | "running" | "done" | "failed";
  declare problems: ScenarioProblem[] | null;
  declare inputHash: string | null;
  declare engineVersion: string | null;
  /** What the last run stood on. */
  declare inputs: CreationOptional<RunInputs | null>;
  declare requestedBy: string;
  declare startedAt: Date | null;
  declare finishedAt: Date | null;
  declare createdAt: CreationOptional<Date>;
  declare updatedAt: CreationOptional<Date>;
}

Estimate.init(
  {
    id: { type: DataTypes.TEXT, primaryKey: true },
    organisationId: { type: DataTypes.TEXT, allowNull: false },
    projectId: { type: DataTypes.TEXT, allowNull: false },
    number: { type: DataTypes.INTEGER, allowNull: false },
    studyBoxId: { type: DataTypes.TEXT, allowNull: false },
    stormId: { type: DataTypes.TEXT, allowNull: false },
    waterColumnId: { type: DataTypes.TEXT, allowNull: false },
    methodSheetId: { type: DataTypes.TEXT, allowNull: false },
    state: { type: DataTypes.TEXT, allowNull: false },
    problems: { type: DataTypes.JSON, allowNull: true },
    inputHash: { type: DataTypes.TEXT, allowNull: true },
    engineVersion: { type: DataTypes.TEXT, allowNull: true },
    inputs: { type: DataTypes.JSON, allowNull: true },
    requestedBy: { type: DataTypes.TEXT, allowNull: false },
    startedAt: { type: DataTypes.DATE, allowNull: true },
    finishedAt: { type: DataTypes.DATE, allowNull: true },
    createdAt: DataTypes.DATE,
    updatedAt: DataTypes.DATE,
  },
  { sequelize, tableName: "estimates", modelName: "Estimate" },
);
