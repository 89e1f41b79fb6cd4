import { type CreationOptional, DataTypes, type InferAttributes, type InferCreationAttributes, Model } from "sequelize";
import { sequelize } from "../connection.server";
import type { MissingAccepted } from "~/quality/missing-rule";
import type { StormTrack } from "~/storms/storm-track";

/** A named event: a time window with its forcing series. */
export class Storm extends Model<InferAttributes<Storm>, InferCreationAttributes<Storm>> {
  declare id: string;
  declare organisationId: string;
  declare projectId: string;
  declare name: string;
  /** Seconds since 1970 UTC; null until a record is confirmed. */
  declare startsAt: number | null;
  declare endsAt: number | null;
  /** Whether estimates leave suspect values out; they keep them by default. */
  declare leaveOutSuspect: CreationOptional<boolean>;
  /** Who took it on to estimate with more missing than the rule allows, and why; null while nobody did. */
  declare missingAccepted: CreationOptional<MissingAccepted | null>;
  /** The cyclone's track that gives wind and rain where no record does; null for a storm of records alone. */
  declare track: CreationOptional<StormTrack | null>;
  /** The track's original; with no track yet, its questions are open. */
  declare trackFileId: CreationOptional<string | null>;
  declare createdAt: CreationOptional<Date>;
  declare updatedAt: CreationOptional<Date>;
}

Storm.init(
  {
    id: { type: DataTypes.TEXT, primaryKey: true },
    organisationId: { type: DataTypes.TEXT, allowNull: false },
    projectId: { type: DataTypes.TEXT, allowNull: false },
    name: { type: DataTypes.TEXT, allowNull: false, validate: { len: [1, 120] } },
    startsAt: { type: DataTypes.DOUBLE, allowNull: true },
    endsAt: { type: DataTypes.DOUBLE, allowNull: true },
    leaveOutSuspect: { type: DataTypes.BOOLEAN, allowNull: false, defaultValue: false },
    missingAccepted: { type: DataTypes.JSON, allowNull: true },
    track: { type: DataTypes.JSON, allowNull: true },
    trackFileId: { type: DataTypes.TEXT, allowNull: true },
    createdAt: DataTypes.DATE,
    updatedAt: DataTypes.DATE,
  },
  { sequelize, tableName: "storms", modelName: "Storm" },
);
