import { type CreationOptional, DataTypes, type InferAttributes, type InferCreationAttributes, Model } from "sequelize";
import { sequelize } from "../connection.server";
import type { StoredSeriesName } from "~/estimates/stored-series";

export class ResultSeries extends Model<InferAttributes<ResultSeries>, InferCreationAttributes<ResultSeries>> {
  declare id: string;
  declare organisationId: string;
  declare resultId: string;
  declare name: StoredSeriesName;
  declare unit: string;
  declare length: number;
  declare values: Buffer;
  declare createdAt: CreationOptional<Date>;
  declare updatedAt: CreationOptional<Date>;
}

ResultSeries.init(
  {
    id: { type: DataTypes.TEXT, primaryKey: true },
    organisationId: { type: DataTypes.TEXT, allowNull: false },
    resultId: { type: DataTypes.TEXT, allowNull: false },
    name: { type: DataTypes.TEXT, allowNull: false },
    unit: { type: DataTypes.TEXT, allowNull: false },
    length: { type: DataTypes.INTEGER, allowNull: false },
    values: { type: DataTypes.BLOB, allowNull: false },
    createdAt: DataTypes.DATE,
    updatedAt: DataTypes.DATE,
  },
  { sequelize, tableName: "resultSeries", modelName: "ResultSeries" },
);
