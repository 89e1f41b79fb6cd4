import { type CreationOptional, DataTypes, type InferAttributes, type InferCreationAttributes, Model } from "sequelize";
import { sequelize } from "../connection.server";

export class ShareVisit extends Model<InferAttributes<ShareVisit>, InferCreationAttributes<ShareVisit>> {
  declare id: string;
  declare organisationId: string;
  declare shareLinkId: string;
  declare act: "opened" | "downloaded";
  declare createdAt: CreationOptional<Date>;
  declare updatedAt: CreationOptional<Date>;
}

ShareVisit.init(
  {
    id: { type: DataTypes.TEXT, primaryKey: true },
    organisationId: { type: DataTypes.TEXT, allowNull: false },
    shareLinkId: { type: DataTypes.TEXT, allowNull: false },
    act: { type: DataTypes.TEXT, allowNull: false },
    createdAt: DataTypes.DATE,
    updatedAt: DataTypes.DATE,
  },
  { sequelize, tableName: "shareVisits", modelName: "ShareVisit" },
);
