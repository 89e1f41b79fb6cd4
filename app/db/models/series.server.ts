import { type CreationOptional, DataTypes, type InferAttributes, type InferCreationAttributes, Model } from "sequelize";
import { sequelize } from "../connection.server";
import type { ChannelName } from "~/readers/reading";

/** One channel of a storm. `time` (seconds since 1970 UTC) and `values` are float64 blobs of `length` numbers. */
export class Series extends Model<InferAttributes<Series>, InferCreationAttributes<Series>> {
  declare id: string;
  declare organisationId: string;
  declare stormId: string;
  declare recordId: string;
  declare channel: ChannelName;
  declare unit: string;
  declare length: number;
  declare time: Buffer;
  declare values: Buffer;
  declare createdAt: CreationOptional<Date>;
  declare updatedAt: CreationOptional<Date>;
}

Series.init(
  {
    id: { type: DataTypes.TEXT, primaryKey: true },
    organisationId: { type: DataTypes.TEXT, allowNull: false },
    stormId: { type: DataTypes.TEXT, allowNull: false },
    recordId: { type: DataTypes.TEXT, allowNull: false },
    channel: { type: DataTypes.TEXT, allowNull: false },
    unit: { type: DataTypes.TEXT, allowNull: false },
    length: { type: DataTypes.INTEGER, allowNull: false, validate: { min: 1 } },
    time: { type: DataTypes.BLOB, allowNull: false },
    values: { type: DataTypes.BLOB, allowNull: false },
    createdAt: DataTypes.DATE,
    updatedAt: DataTypes.DATE,
  },
  { sequelize, tableName: "series", modelName: "Series" },
);
