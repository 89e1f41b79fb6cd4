import { type CreationOptional, DataTypes, type InferAttributes, type InferCreationAttributes, Model } from "sequelize";
import { sequelize } from "../connection.server";

/** An original, kept byte for byte. */
export class SourceFile extends Model<InferAttributes<SourceFile>, InferCreationAttributes<SourceFile>> {
  declare id: string;
  declare organisationId: string;
  declare projectId: string;
  declare name: string;
  declare sha256: string;
  declare size: number;
  declare bytes: Buffer;
  declare uploadedBy: string;
  declare createdAt: CreationOptional<Date>;
  declare updatedAt: CreationOptional<Date>;
}

SourceFile.init(
  {
    id: { type: DataTypes.TEXT, primaryKey: true },
    organisationId: { type: DataTypes.TEXT, allowNull: false },
    projectId: { type: DataTypes.TEXT, allowNull: false },
    name: { type: DataTypes.TEXT, allowNull: false, validate: { len: [1, 255] } },
    sha256: { type: DataTypes.TEXT, allowNull: false, validate: { is: /^[0-9a-f]{64}$/ } },
    size: { type: DataTypes.INTEGER, allowNull: false },
    bytes: { type: DataTypes.BLOB, allowNull: false },
    uploadedBy: { type: DataTypes.TEXT, allowNull: false },
    createdAt: DataTypes.DATE,
    updatedAt: DataTypes.DATE,
  },
  { sequelize, tableName: "sourceFiles", modelName: "SourceFile" },
);
