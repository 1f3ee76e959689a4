import { DataTypes, Model, type CreationOptional, type InferAttributes, type InferCreationAttributes } from "sequelize";
import { sequelize } from "../connection";
import { id, recordedMoment, reference, text } from "./columns";

/** One sending with a key made on the device: the same key twice is one submission. */
export class Submission extends Model<InferAttributes<Submission>, InferCreationAttributes<Submission>> {
  declare id: CreationOptional<string>;
  declare authorId: string;
  declare clientKey: string;
  /** SHA-256 in lower-case hexadecimal. */
  declare bodyHash: string;
  declare recordedAt: CreationOptional<Date>;
}

Submission.init(
  {
    id: id(),
    authorId: reference(),
    clientKey: { type: DataTypes.UUID, allowNull: false },
    bodyHash: text(),
    recordedAt: recordedMoment(),
  },
  { sequelize, tableName: "submissions" },
);
