import { DataTypes, Model, type CreationOptional, type InferAttributes, type InferCreationAttributes } from "sequelize";
import { sequelize } from "../connection";
import { id, optionalText, text } from "./columns";

export class User extends Model<InferAttributes<User>, InferCreationAttributes<User>> {
  declare id: CreationOptional<string>;
  /** Lower case. */
  declare email: string;
  declare name: string;
  declare title: string | null;
  declare passwordHash: string | null;
  declare sessionVersion: CreationOptional<number>;
}

User.init(
  {
    id: id(),
    email: text(),
    name: text(),
    title: optionalText(),
    passwordHash: optionalText(),
    sessionVersion: { type: DataTypes.INTEGER },
  },
  { sequelize, tableName: "users" },
);
