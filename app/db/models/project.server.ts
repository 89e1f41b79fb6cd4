import { type CreationOptional, DataTypes, type InferAttributes, type InferCreationAttributes, Model } from "sequelize";
import { sequelize } from "../connection.server";

/** One job for one client. */
export class Project extends Model<InferAttributes<Project>, InferCreationAttributes<Project>> {
  declare id: string;
  declare organisationId: string;
  declare name: string;
  declare jobNumber: string;
  declare client: string;
  declare timeZone: string;
  declare cautionsAcceptedAt: Date;
  declare cautionsAcceptedBy: string;
  declare createdAt: CreationOptional<Date>;
  declare updatedAt: CreationOptional<Date>;
}

Project.init(
  {
    id: { type: DataTypes.TEXT, primaryKey: true },
    organisationId: { type: DataTypes.TEXT, allowNull: false },
    name: { type: DataTypes.TEXT, allowNull: false, validate: { len: [1, 120] } },
    jobNumber: { type: DataTypes.TEXT, allowNull: false, validate: { len: [1, 40] } },
    client: { type: DataTypes.TEXT, allowNull: false, validate: { len: [1, 120] } },
    timeZone: { type: DataTypes.TEXT, allowNull: false },
    cautionsAcceptedAt: { type: DataTypes.DATE, allowNull: false },
    cautionsAcceptedBy: { type: DataTypes.TEXT, allowNull: false },
    createdAt: DataTypes.DATE,
    updatedAt: DataTypes.DATE,
  },
  { sequelize, tableName: "projects", modelName: "Project" },
);
