import { type CreationOptional, DataTypes, type InferAttributes, type InferCreationAttributes, Model } from "sequelize";
import { sequelize } from "../connection.server";
import type { Position, TriggerLevel } from "~/ocean/scenario";

export class StudyBox extends Model<InferAttributes<StudyBox>, InferCreationAttributes<StudyBox>> {
  declare id: string;
  declare organisationId: string;
  declare projectId: string;
  declare name: string;
  /** Closed ring, counter-clockwise, longitude before latitude. */
  declare polygon: Position[];
  /** m */
  declare waterDepth: number | null;
  /** degrees true, pointing offshore */
  declare shoreNormal: number | null;
  /** m */
  declare distanceToShore: number | null;
  /** 0…1; null where no basemap was there to tell. */
  declare landShare: number | null;
  declare triggerLevels: TriggerLevel[];
  declare createdAt: CreationOptional<Date>;
  declare updatedAt: CreationOptional<Date>;
}

StudyBox.init(
  {
    id: { type: DataTypes.TEXT, primaryKey: true },
    organisationId: { type: DataTypes.TEXT, allowNull: false },
    projectId: { type: DataTypes.TEXT, allowNull: false },
    name: { type: DataTypes.TEXT, allowNull: false, validate: { len: [1, 120] } },
    polygon: { type: DataTypes.JSON, allowNull: false },
    waterDepth: { type: DataTypes.DOUBLE, allowNull: true, validate: { min: 0.1, max: 11_000 } },
    shoreNormal: { type: DataTypes.DOUBLE, allowNull: true, validate: { min: 0, max: 360 } },
    distanceToShore: { type: DataTypes.DOUBLE, allowNull: true, validate: { min: 0 } },
    landShare: { type: DataTypes.DOUBLE, allowNull: true, validate: { min: 0, max: 1 } },
    triggerLevels: { type: DataTypes.JSON, allowNull: false },
    createdAt: DataTypes.DATE,
    updatedAt: DataTypes.DATE,
  },
  { sequelize, tableName: "studyBoxes", modelName: "StudyBox" },
);
