import { type CreationOptional, DataTypes, type InferAttributes, type InferCreationAttributes, Model } from "sequelize";
import { sequelize } from "../connection.server";

/** Two layers: the one the storm works on, and, where known, what lies below. */
export class WaterColumn extends Model<InferAttributes<WaterColumn>, InferCreationAttributes<WaterColumn>> {
  declare id: string;
  declare organisationId: string;
  declare projectId: string;
  declare name: string;
  /** Where the numbers come from, in the consultant's words. */
  declare source: string;
  /** In-situ, °C. */
  declare temperature: number;
  /** On `salinityScale`, as are the numbers below. */
  declare salinity: number;
  declare salinityScale: "absolute" | "practical";
  /** m */
  declare layerDepth: number;
  declare belowTemperature: number | null;
  declare belowSalinity: number | null;
  declare createdAt: CreationOptional<Date>;
  declare updatedAt: CreationOptional<Date>;
}

WaterColumn.init(
  {
    id: { type: DataTypes.TEXT, primaryKey: true },
    organisationId: { type: DataTypes.TEXT, allowNull: false },
    projectId: { type: DataTypes.TEXT, allowNull: false },
    name: { type: DataTypes.TEXT, allowNull: false, validate: { len: [1, 120] } },
    source: { type: DataTypes.TEXT, allowNull: false },
    temperature: { type: DataTypes.DOUBLE, allowNull: false, validate: { min: -3, max: 45 } },
    salinity: { type: DataTypes.DOUBLE, allowNull: false, validate: { min: 0, max: 60 } },
    salinityScale: { type: DataTypes.TEXT, allowNull: false },
    layerDepth: { type: DataTypes.DOUBLE, allowNull: false, validate: { min: 0.1, max: 11_000 } },
    belowTemperature: { type: DataTypes.DOUBLE, allowNull: true },
    belowSalinity: { type: DataTypes.DOUBLE, allowNull: true },
    createdAt: DataTypes.DATE,
    updatedAt: DataTypes.DATE,
  },
  { sequelize, tableName: "waterColumns", modelName: "WaterColumn" },
);
