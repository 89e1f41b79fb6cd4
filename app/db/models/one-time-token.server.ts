import { type CreationOptional, DataTypes, type InferAttributes, type InferCreationAttributes, Model } from "sequelize";
import { sequelize } from "../connection.server";

export type TokenPurpose = "invitation" | "confirm-address" | "reset-password";

/** Stands for a link that works once. Its token is made as the mail leaves; only the hash is kept. */
export class OneTimeToken extends Model<InferAttributes<OneTimeToken>, InferCreationAttributes<OneTimeToken>> {
  declare id: string;
  declare purpose: TokenPurpose;
  /** The invitation or the user that it is for. */
  declare subjectId: string;
  declare tokenHash: string | null;
  declare expiresAt: Date;
  declare usedAt: Date | null;
  declare createdAt: CreationOptional<Date>;
  declare updatedAt: CreationOptional<Date>;
}

OneTimeToken.init(
  {
    id: { type: DataTypes.TEXT, primaryKey: true },
    purpose: { type: DataTypes.TEXT, allowNull: false },
    subjectId: { type: DataTypes.TEXT, allowNull: false },
    tokenHash: { type: DataTypes.TEXT, allowNull: true },
    expiresAt: { type: DataTypes.DATE, allowNull: false },
    usedAt: { type: DataTypes.DATE, allowNull: true },
    createdAt: DataTypes.DATE,
    updatedAt: DataTypes.DATE,
  },
  { sequelize, tableName: "oneTimeTokens", modelName: "OneTimeToken" },
);
