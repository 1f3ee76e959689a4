import { Model, type CreationOptional, type InferAttributes, type InferCreationAttributes } from "sequelize";
import { sequelize } from "../connection";
import { entryKey, number, optionalText } from "./columns";

export class Observation extends Model<InferAttributes<Observation>, InferCreationAttributes<Observation>> {
  declare entryId: string;
  declare kind: CreationOptional<"observations">;
  declare spo2Percent: number | null;
  declare etco2MmHg: number | null;
  declare respiratoryRateTotal: number | null;
  declare heartRate: number | null;
  declare systolicMmHg: number | null;
  declare mapMmHg: number | null;
}

Observation.init(
  {
    entryId: entryKey(),
    kind: optionalText(),
    spo2Percent: number(),
    etco2MmHg: number("etco2_mm_hg"),
    respiratoryRateTotal: number(),
    heartRate: number(),
    systolicMmHg: number("systolic_mm_hg"),
    mapMmHg: number("map_mm_hg"),
  },
  { sequelize, tableName: "observations" },
);
