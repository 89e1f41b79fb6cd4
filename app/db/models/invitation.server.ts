import { type CreationOptional, DataTypes, type InferAttributes, type InferCreationAttributes, Model } from "sequelize";
import { sequelize } from "../connection.server";
import { ROLES, type Role } from "~/organisations/permissions";

/** Someone who was asked to join and has not answered yet; the row is gone when they have, or when it is revoked. */
export class Invitation extends Model<InferAttributes<Invitation>, InferCreationAttributes<Invitation>> {
  declare id: string;
  declare organisationId: string;
  declare email: string;
  declare role: Role;
  declare mayCheck: boolean;
  declare mayIssue: boolean;
  declare invitedBy: string;
  declare expiresAt: Date;
  declare createdAt: CreationOptional<Date>;
  declare updatedAt: CreationOptional<Date>;
}

Invitation.init(
  {
    id: { type: DataTypes.TEXT, primaryKey: true },
    organisationId: { type: DataTypes.TEXT, allowNull: false },
    email: { type: DataTypes.TEXT, allowNull: false, validate: { isEmail: true, isLowercase: true } },
    role: { type: DataTypes.TEXT, allowNull: false, validate: { isIn: [[...ROLES]] } },
    mayCheck: { type: DataTypes.BOOLEAN, allowNull: false },
    mayIssue: { type: DataTypes.BOOLEAN, allowNull: false },
    invitedBy: { type: DataTypes.TEXT, allowNull: false },
    expiresAt: { type: DataTypes.DATE, allowNull: false },
    createdAt: DataTypes.DATE,
    updatedAt: DataTypes.DATE,
  },
  { sequelize, tableName: "invitations", modelName: "Invitation" },
);
