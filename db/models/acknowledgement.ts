import { Model, type CreationOptional, type InferAttributes, type InferCreationAttributes } from "sequelize";
import { sequelize } from "../connection";
import { entryKey, moment, number, optionalText, text } from "./columns";

/** Somebody answered a finding: what they will do, and until when it stays quiet. */
export class Acknowledgement extends Model<InferAttributes<Acknowledgement>, InferCreationAttributes<Acknowledgement>> {
  declare entryId: string;
  declare kind: CreationOptional<"acknowledgements">;
  declare metric: string;
  /** The value that was answered. */
  declare value: number | null;
  declare until: Date;
  declare note: string;
}

Acknowledgement.init(
  { entryId: entryKey(), kind: optionalText(), metric: text(), value: number(), until: moment(), note: text() },
  { sequelize, tableName: "acknowledgements" },
);
