import { Model, type CreationOptional, type InferAttributes, type InferCreationAttributes } from "sequelize";
import { sequelize } from "../connection";
import { entryKey, number, optionalText, text } from "./columns";

export class Height extends Model<InferAttributes<Height>, InferCreationAttributes<Height>> {
  declare entryId: string;
  declare kind: CreationOptional<"heights">;
  declare method:
    "measured-standing" | "measured-lying" | "document" | "ulna" | "knee-height" | "demispan" | "reported";
  declare sexForPbw: "male" | "female";
  /** As measured, or as worked out from the length below when it was charted. */
  declare heightCm: number;
  declare ulnaCm: number | null;
  declare demispanCm: number | null;
  declare kneeHeightCm: number | null;
  /** Why a lower method replaced a higher one. */
  declare reason: string | null;
}

Height.init(
  {
    entryId: entryKey(),
    kind: optionalText(),
    method: text(),
    sexForPbw: text(),
    heightCm: { ...number(), allowNull: false },
    ulnaCm: number(),
    demispanCm: number(),
    kneeHeightCm: number(),
    reason: optionalText(),
  },
  { sequelize, tableName: "heights" },
);
