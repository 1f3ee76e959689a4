import { Model, type CreationOptional, type InferAttributes, type InferCreationAttributes } from "sequelize";
import { sequelize } from "../connection";
import { entryKey, flag, number, optionalText } from "./columns";

export class MechanicsReading extends Model<
  InferAttributes<MechanicsReading>,
  InferCreationAttributes<MechanicsReading>
> {
  declare entryId: string;
  declare kind: CreationOptional<"mechanics">;
  declare exhaledTidalVolumeMl: number | null;
  declare spontaneousTidalVolumeMl: number | null;
  declare respiratoryRateTotal: number | null;
  declare minuteVolumeLPerMin: number | null;
  declare peakCmH2O: number | null;
  declare plateauCmH2O: number | null;
  declare hold: "relaxed" | "effort" | "unsure" | "not-possible" | null;
  declare holdReason: string | null;
  declare endInspiratoryFlowZero: boolean | null;
  declare totalPeepCmH2O: number | null;
  declare meanAirwayPressureCmH2O: number | null;
  declare breathStacking: boolean | null;
  declare pesEndInspiratoryCmH2O: number | null;
  declare pesEndExpiratoryCmH2O: number | null;
}

MechanicsReading.init(
  {
    entryId: entryKey(),
    kind: optionalText(),
    exhaledTidalVolumeMl: number(),
    spontaneousTidalVolumeMl: number(),
    respiratoryRateTotal: number(),
    minuteVolumeLPerMin: number("minute_volume_l_per_min"),
    peakCmH2O: number("peak_cm_h2o"),
    plateauCmH2O: number("plateau_cm_h2o"),
    hold: optionalText(),
    holdReason: optionalText(),
    endInspiratoryFlowZero: flag(),
    totalPeepCmH2O: number("total_peep_cm_h2o"),
    meanAirwayPressureCmH2O: number("mean_airway_pressure_cm_h2o"),
    breathStacking: flag(),
    pesEndInspiratoryCmH2O: number("pes_end_inspiratory_cm_h2o"),
    pesEndExpiratoryCmH2O: number("pes_end_expiratory_cm_h2o"),
  },
  { sequelize, tableName: "mechanics_readings" },
);
