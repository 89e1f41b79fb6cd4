import { type CreationOptional, DataTypes, type InferAttributes, type InferCreationAttributes, Model } from "sequelize";
import { sequelize } from "../connection.server";
import type { Mail } from "~/mail/mail-facts";

/** A mail that waits, or what became of it. */
export class OutboxMail extends Model<InferAttributes<OutboxMail>, InferCreationAttributes<OutboxMail>> {
  declare id: string;
  declare recipient: string;
  declare mail: Mail;
  /** Where its button leads, from the root of the site; the token of `tokenId` is put after it. */
  declare path: string;
  declare tokenId: string | null;
  /** Dropped: its link ran out or was used or replaced before it could be sent. */
  declare state: "waiting" | "sent" | "failed" | "dropped";
  declare attempts: number;
  declare dueAt: Date;
  declare lastError: string | null;
  declare createdAt: CreationOptional<Date>;
  declare updatedAt: CreationOptional<Date>;
}

OutboxMail.init(
  {
    id: { type: DataTypes.TEXT, primaryKey: true },
    recipient: { type: DataTypes.TEXT, allowNull: false },
    mail: { type: DataTypes.JSON, allowNull: false },
    path: { type: DataTypes.TEXT, allowNull: false },
    tokenId: { type: DataTypes.TEXT, allowNull: true },
    state: { type: DataTypes.TEXT, allowNull: false },
    attempts: { type: DataTypes.INTEGER, allowNull: false },
    dueAt: { type: DataTypes.DATE, allowNull: false },
    lastError: { type: DataTypes.TEXT, allowNull: true },
    createdAt: DataTypes.DATE,
    updatedAt: DataTypes.DATE,
  },
  { sequelize, tableName: "outboxMails", modelName: "OutboxMail" },
);
