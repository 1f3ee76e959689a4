import { Model, type CreationOptional, type InferAttributes, type InferCreationAttributes } from "sequelize";
import { sequelize } from "../connection";
import { id, text } from "./columns";

export class Hospital extends Model<InferAttributes<Hospital>, InferCreationAttributes<Hospital>> {
  declare id: CreationOptional<string>;
  declare name: string;
}

Hospital.init({ id: id(), name: text() }, { sequelize, tableName: "hospitals" });
