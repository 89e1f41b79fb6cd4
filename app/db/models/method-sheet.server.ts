import { type CreationOptional, DataTypes, type InferAttributes, type InferCreationAttributes, Model } from "sequelize";
import { sequelize } from "../connection.server";
import type { Ensemble, MethodChoices } from "~/ocean/scenario";

/** A named, versioned choice of laws and parameters. A version is never edited: a change is the next version. */
export class MethodSheet extends Model<InferAttributes<MethodSheet>, InferCreationAttributes<MethodSheet>> {
  declare id: string;
  declare organisationId: string;
  declare name: string;
  declare version: number;
  declare choices: MethodChoices;
  /** Null: no ensemble is run. */
  declare ensemble: CreationOptional<Ensemble | null>;
  declare createdAt: CreationOptional<Date>;
  declare updatedAt: CreationOptional<Date>;
}

MethodSheet.init(
  {
    id: { type: DataTypes.TEXT, primaryKey: true },
    organisationId: { type: DataTypes.TEXT, allowNull: false },
    name: { type: DataTypes.TEXT, allowNull: false, validate: { len: [1, 120] } },
    version: { type: DataTypes.INTEGER, allowNull: false },
    choices: { type: DataTypes.JSON, allowNull: false },
    ensemble: { type: DataTypes.JSON, allowNull: true },
    createdAt: DataTypes.DATE,
    updatedAt: DataTypes.DATE,
  },
  { sequelize, tableName: "methodSheets", modelName: "MethodSheet" },
);
