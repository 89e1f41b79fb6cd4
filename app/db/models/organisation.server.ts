import { type CreationOptional, DataTypes, type InferAttributes, type InferCreationAttributes, Model } from "sequelize";
import { sequelize } from "../connection.server";
import type { PageSize } from "~/memo/document";
import type { UnitChoices } from "~/units/unit-choices";

/** A consultancy: the tenant. */
export class Organisation extends Model<InferAttributes<Organisation>, InferCreationAttributes<Organisation>> {
  declare id: string;
  declare slug: string;
  declare name: string;
  declare units: UnitChoices;
  declare paperSize: PageSize;
  declare createdAt: CreationOptional<Date>;
  declare updatedAt: CreationOptional<Date>;
}

Organisation.init(
  {
    id: { type: DataTypes.TEXT, primaryKey: true },
    slug: { type: DataTypes.TEXT, allowNull: false, validate: { is: /^[a-z0-9][a-z0-9-]{1,47}$/ } },
    name: { type: DataTypes.TEXT, allowNull: false, validate: { len: [1, 120] } },
    units: { type: DataTypes.JSON, allowNull: false },
    paperSize: { type: DataTypes.TEXT, allowNull: false, validate: { isIn: [["A4", "Letter"]] } },
    createdAt: DataTypes.DATE,
    updatedAt: DataTypes.DATE,
  },
  { sequelize, tableName: "organisations", modelName: "Organisation" },
);
