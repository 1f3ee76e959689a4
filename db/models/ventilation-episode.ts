import { Model, type CreationOptional, type InferAttributes, type InferCreationAttributes } from "sequelize";
import { sequelize } from "../connection";
import { id, moment, number, optionalMoment, optionalText, reference } from "./columns";

export class VentilationEpisode extends Model<
  InferAttributes<VentilationEpisode>,
  InferCreationAttributes<VentilationEpisode>
> {
  declare id: CreationOptional<string>;
  declare patientId: string;
  declare unitId: string;
  /** Of the admission: its repeat finds the episode by it. */
  declare submissionId: string;
  declare intubatedAt: Date;
  declare endedAt: Date | null;
  declare endReason: "liberation" | "tracheostomy-collar" | "death" | "transfer" | null;
  declare reasonForVentilation: string | null;
  declare ardsRiskFactor: string | null;
  declare tubeSizeMm: number | null;
  declare tubeDepthCm: number | null;
}

VentilationEpisode.init(
  {
    id: id(),
    patientId: reference(),
    unitId: reference(),
    submissionId: reference(),
    intubatedAt: moment(),
    endedAt: optionalMoment(),
    endReason: optionalText(),
    reasonForVentilation: optionalText(),
    ardsRiskFactor: optionalText(),
    tubeSizeMm: number(),
    tubeDepthCm: number(),
  },
  { sequelize, tableName: "ventilation_episodes" },
);
