import { DataTypes, Model, type CreationOptional, type InferAttributes, type InferCreationAttributes } from "sequelize";
import { sequelize } from "../connection";
import { id, reference, text } from "./columns";

export class Bed extends Model<InferAttributes<Bed>, InferCreationAttributes<Bed>> {
  declare id: CreationOptional<string>;
  declare unitId: string;
  declare label: string;
  declare sortOrder: number;
}

Bed.init(
  { id: id(), unitId: reference(), label: text(), sortOrder: { type: DataTypes.INTEGER, allowNull: false } },
  { sequelize, tableName: "beds" },
);
