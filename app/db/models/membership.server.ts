import { type CreationOptional, DataTypes, type InferAttributes, type InferCreationAttributes, Model } from "sequelize";
import { sequelize } from "../connection.server";
import { ROLES, type Role } from "~/organisations/permissions";

/** Who belongs to an organisation, as what. */
export class Membership extends Model<InferAttributes<Membership>, InferCreationAttributes<Membership>> {
  declare id: string;
  declare organisationId: string;
  declare userId: string;
  declare role: Role;
  declare mayCheck: boolean;
  declare mayIssue: boolean;
  /** From then on the organisation does not exist for them. */
  declare suspendedAt: CreationOptional<Date | null>;
  /** Grows with each change, so that of two people who change it at once the second is told. */
  declare version: CreationOptional<number>;
  declare createdAt: CreationOptional<Date>;
  declare updatedAt: CreationOptional<Date>;
}

Membership.init(
  {
    id: { type: DataTypes.TEXT, primaryKey: true },
    organisationId: { type: DataTypes.TEXT, allowNull: false },
    userId: { type: DataTypes.TEXT, allowNull: false },
    role: { type: DataTypes.TEXT, allowNull: false, validate: { isIn: [[...ROLES]] } },
    mayCheck: { type: DataTypes.BOOLEAN, allowNull: false },
    mayIssue: { type: DataTypes.BOOLEAN, allowNull: false },
    suspendedAt: { type: DataTypes.DATE, allowNull: true },
    version: { type: DataTypes.INTEGER, allowNull: false, defaultValue: 1 },
    createdAt: DataTypes.DATE,
    updatedAt: DataTypes.DATE,
  },
  { sequelize, tableName: "memberships", modelName: "Membership" },
);
