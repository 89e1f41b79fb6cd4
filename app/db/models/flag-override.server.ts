import { type CreationOptional, DataTypes, type InferAttributes, type InferCreationAttributes, Model } from "sequelize";
import { sequelize } from "../connection.server";
import type { SetFlag } from "~/quality/overrides";
import type { ChannelName } from "~/readers/reading";

/** A flag that a person set on one sample. Never edited: taking it back is another one. */
export class FlagOverride extends Model<InferAttributes<FlagOverride>, InferCreationAttributes<FlagOverride>> {
  declare id: string;
  declare organisationId: string;
  declare recordId: string;
  declare channel: ChannelName;
  /** Seconds since 1970 UTC. */
  declare at: number;
  /** The sample's value when the flag was set: it holds for no other. */
  declare value: number;
  /** Null: the tests' own flag stands again. */
  declare flag: SetFlag | null;
  declare reason: string;
  declare createdBy: string;
  declare createdAt: CreationOptional<Date>;
  declare updatedAt: CreationOptional<Date>;
}

FlagOverride.init(
  {
    id: { type: DataTypes.TEXT, primaryKey: true },
    organisationId: { type: DataTypes.TEXT, allowNull: false },
    recordId: { type: DataTypes.TEXT, allowNull: false },
    channel: { type: DataTypes.TEXT, allowNull: false },
    at: { type: DataTypes.DOUBLE, allowNull: false },
    value: { type: DataTypes.DOUBLE, allowNull: false },
    flag: { type: DataTypes.INTEGER, allowNull: true },
    reason: { type: DataTypes.TEXT, allowNull: false, validate: { len: [1, 500] } },
    createdBy: { type: DataTypes.TEXT, allowNull: false },
    createdAt: DataTypes.DATE,
    updatedAt: DataTypes.DATE,
  },
  { sequelize, tableName: "flagOverrides", modelName: "FlagOverride" },
);
