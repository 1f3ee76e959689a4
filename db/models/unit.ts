import { Model, type CreationOptional, type InferAttributes, type InferCreationAttributes } from "sequelize";
import { sequelize } from "../connection";
import { id, reference, text } from "./columns";

export class Unit extends Model<InferAttributes<Unit>, InferCreationAttributes<Unit>> {
  declare id: CreationOptional<string>;
  declare hospitalId: string;
  declare name: string;
}

Unit.init({ id: id(), hospitalId: reference(), name: text() }, { sequelize, tableName: "units" });
