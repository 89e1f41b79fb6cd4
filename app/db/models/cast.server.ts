import { type CreationOptional, DataTypes, type InferAttributes, type InferCreationAttributes, Model } from "sequelize";
import { sequelize } from "../connection.server";
import type { CastAnswers } from "~/readers/casts/cast-reading";
import type { CastProvenance } from "~/water/cast-provenance";

/**
 * A file or paste with a cast. Before it is confirmed it has answers alone; then it belongs to a water column, and its
 * levels are float64 blobs of `length` numbers, from the surface down.
 */
export class Cast extends Model<InferAttributes<Cast>, InferCreationAttributes<Cast>> {
  declare id: string;
  declare organisationId: string;
  declare projectId: string;
  declare sourceFileId: string;
  /** Null until it is confirmed. */
  declare waterColumnId: string | null;
  declare name: string;
  declare origin: "file" | "pasted";
  declare answers: CastAnswers;
  declare provenance: CastProvenance | null;
  declare length: number;
  /** m */
  declare depth: Buffer | null;
  /** In situ, °C. */
  declare temperature: Buffer | null;
  /** On the scale of its water column. */
  declare salinity: Buffer | null;
  declare createdBy: string;
  declare createdAt: CreationOptional<Date>;
  declare updatedAt: CreationOptional<Date>;
}

Cast.init(
  {
    id: { type: DataTypes.TEXT, primaryKey: true },
    organisationId: { type: DataTypes.TEXT, allowNull: false },
    projectId: { type: DataTypes.TEXT, allowNull: false },
    sourceFileId: { type: DataTypes.TEXT, allowNull: false },
    waterColumnId: { type: DataTypes.TEXT, allowNull: true },
    name: { type: DataTypes.TEXT, allowNull: false },
    origin: { type: DataTypes.TEXT, allowNull: false },
    answers: { type: DataTypes.JSON, allowNull: false },
    provenance: { type: DataTypes.JSON, allowNull: true },
    length: { type: DataTypes.INTEGER, allowNull: false },
    depth: { type: DataTypes.BLOB, allowNull: true },
    temperature: { type: DataTypes.BLOB, allowNull: true },
    salinity: { type: DataTypes.BLOB, allowNull: true },
    createdBy: { type: DataTypes.TEXT, allowNull: false },
    createdAt: DataTypes.DATE,
    updatedAt: DataTypes.DATE,
  },
  { sequelize, tableName: "casts", modelName: "Cast" },
);
