import { DataTypes, Model, type CreationOptional, type InferAttributes, type InferCreationAttributes } from "sequelize";
import { sequelize } from "../connection";
import { entryKey, number, optionalText } from "./columns";

/** Only what was charted; a row that carries `mode` is complete for that mode. */
export class SettingChange extends Model<InferAttributes<SettingChange>, InferCreationAttributes<SettingChange>> {
  declare entryId: string;
  declare kind: CreationOptional<"settings">;
  declare mode: string | null;
  declare tidalVolumeMl: number | null;
  declare pressureAbovePeepCmH2O: number | null;
  declare pressureSupportCmH2O: number | null;
  declare respiratoryRate: number | null;
  declare peepCmH2O: number | null;
  /** Whole percent; a fraction everywhere else. */
  declare fio2Percent: number | null;
  declare inspiratoryTimeS: number | null;
  declare flowLPerMin: number | null;
  declare flowPattern: "square" | "decelerating" | null;
  declare triggerType: "flow" | "pressure" | null;
  declare triggerLPerMin: number | null;
  declare triggerCmH2O: number | null;
  declare pHighCmH2O: number | null;
  declare pLowCmH2O: number | null;
  declare tHighS: number | null;
  declare tLowS: number | null;
  declare meanAirwayPressureCmH2O: number | null;
  declare frequencyHz: number | null;
  declare amplitudeCmH2O: number | null;
  declare reason: string | null;
}

SettingChange.init(
  {
    entryId: entryKey(),
    kind: optionalText(),
    mode: optionalText(),
    tidalVolumeMl: number(),
    pressureAbovePeepCmH2O: number("pressure_above_peep_cm_h2o"),
    pressureSupportCmH2O: number("pressure_support_cm_h2o"),
    respiratoryRate: number(),
    peepCmH2O: number("peep_cm_h2o"),
    fio2Percent: { type: DataTypes.INTEGER },
    inspiratoryTimeS: number(),
    flowLPerMin: number("flow_l_per_min"),
    flowPattern: optionalText(),
    triggerType: optionalText(),
    triggerLPerMin: number("trigger_l_per_min"),
    triggerCmH2O: number("trigger_cm_h2o"),
    pHighCmH2O: number("p_high_cm_h2o"),
    pLowCmH2O: number("p_low_cm_h2o"),
    tHighS: number("t_high_s"),
    tLowS: number("t_low_s"),
    meanAirwayPressureCmH2O: number("mean_airway_pressure_cm_h2o"),
    frequencyHz: number(),
    amplitudeCmH2O: number("amplitude_cm_h2o"),
    reason: optionalText(),
  },
  { sequelize, tableName: "setting_changes" },
);
