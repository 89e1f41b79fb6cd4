import { type CreationOptional, DataTypes, type InferAttributes, type InferCreationAttributes, Model } from "sequelize";
import { sequelize } from "../connection.server";
import type { ReadingAnswers } from "~/readers/reading";
import type { RecordProvenance } from "~/storms/provenance";

/** What one file, paste or constant brings to a storm: the answers given on its reading sheet, and once confirmed how it was read. */
export class StormRecord extends Model<InferAttributes<StormRecord>, InferCreationAttributes<StormRecord>> {
  declare id: string;
  declare organisationId: string;
  declare stormId: string;
  declare sourceFileId: string | null;
  declare name: string;
  declare origin: "file" | "pasted" | "constant";
  declare state: "reading" | "confirmed";
  declare answers: ReadingAnswers;
  declare provenance: RecordProvenance | null;
  declare createdBy: string;
  declare createdAt: CreationOptional<Date>;
  declare updatedAt: CreationOptional<Date>;
}

StormRecord.init(
  {
    id: { type: DataTypes.TEXT, primaryKey: true },
    organisationId: { type: DataTypes.TEXT, allowNull: false },
    stormId: { type: DataTypes.TEXT, allowNull: false },
    sourceFileId: { type: DataTypes.TEXT, allowNull: true },
    name: { type: DataTypes.TEXT, allowNull: false },
    origin: { type: DataTypes.TEXT, allowNull: false },
    state: { type: DataTypes.TEXT, allowNull: false },
    answers: { type: DataTypes.JSON, allowNull: false },
    provenance: { type: DataTypes.JSON, allowNull: true },
    createdBy: { type: DataTypes.TEXT, allowNull: false },
    createdAt: DataTypes.DATE,
    updatedAt: DataTypes.DATE,
  },
  { sequelize, tableName: "records", modelName: "StormRecord" },
);
