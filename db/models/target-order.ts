import { Model, type CreationOptional, type InferAttributes, type InferCreationAttributes } from "sequelize";
import { sequelize } from "../connection";
import { entryKey, json, optionalText } from "./columns";

export class TargetOrder extends Model<InferAttributes<TargetOrder>, InferCreationAttributes<TargetOrder>> {
  declare entryId: string;
  declare kind: CreationOptional<"targets">;
  declare targets: object;
  declare reason: string | null;
}

TargetOrder.init(
  { entryId: entryKey(), kind: optionalText(), targets: { ...json(), allowNull: false }, reason: optionalText() },
  { sequelize, tableName: "target_orders" },
);
