import { Model, type CreationOptional, type InferAttributes, type InferCreationAttributes } from "sequelize";
import { sequelize } from "../connection";
import { flag, id, json, number, optionalMoment, optionalReference, recordedMoment, reference, text } from "./columns";

/** Append-only: the newest version of a unit by (recordedAt, id) is in force. */
export class UnitPolicy extends Model<InferAttributes<UnitPolicy>, InferCreationAttributes<UnitPolicy>> {
  declare id: CreationOptional<string>;
  declare unitId: string;
  declare recordedAt: CreationOptional<Date>;
  declare authorId: string | null;
  declare timeZone: string;
  declare barometricPressureMmHg: number;
  declare gasUnit: "mmHg" | "kPa";
  declare nursesSetVentilators: CreationOptional<boolean>;
  /** Minutes, by name; what is missing keeps its starting value. */
  declare intervals: CreationOptional<Record<string, number>>;
  declare margins: CreationOptional<Record<string, number>>;
  declare steps: CreationOptional<Record<string, number>>;
  declare defaultTargets: object;
  declare shifts: CreationOptional<{ name: string; startsAt: string }[]>;
  declare nextStepsEnabledBy: string | null;
  declare nextStepsEnabledAt: Date | null;
}

UnitPolicy.init(
  {
    id: id(),
    unitId: reference(),
    recordedAt: recordedMoment(),
    authorId: optionalReference(),
    timeZone: text(),
    barometricPressureMmHg: { ...number(), allowNull: false },
    gasUnit: text(),
    nursesSetVentilators: flag(),
    intervals: json(),
    margins: json(),
    steps: json(),
    defaultTargets: { ...json(), allowNull: false },
    shifts: json(),
    nextStepsEnabledBy: optionalReference(),
    nextStepsEnabledAt: optionalMoment(),
  },
  { sequelize, tableName: "unit_policies" },
);
