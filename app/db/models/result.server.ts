import { type CreationOptional, DataTypes, type InferAttributes, type InferCreationAttributes, Model } from "sequelize";
import { sequelize } from "../connection.server";
import type { Response } from "~/ocean/response";

/** A response without its series, which stand in `resultSeries`; `time` as in `Series`. */
export class Result extends Model<InferAttributes<Result>, InferCreationAttributes<Result>> {
  declare id: string;
  declare organisationId: string;
  declare inputHash: string;
  declare engineVersion: string;
  declare response: Omit<Response, "series" | "column">;
  declare length: number;
  declare time: Buffer;
  declare createdAt: CreationOptional<Date>;
  declare updatedAt: CreationOptional<Date>;
}

Result.init(
  {
    id: { type: DataTypes.TEXT, primaryKey: true },
    organisationId: { type: DataTypes.TEXT, allowNull: false },
    inputHash: { type: DataTypes.TEXT, allowNull: false },
    engineVersion: { type: DataTypes.TEXT, allowNull: false },
    response: { type: DataTypes.JSON, allowNull: false },
    length: { type: DataTypes.INTEGER, allowNull: false },
    time: { type: DataTypes.BLOB, allowNull: false },
    createdAt: DataTypes.DATE,
    updatedAt: DataTypes.DATE,
  },
  { sequelize, tableName: "results", modelName: "Result" },
);
