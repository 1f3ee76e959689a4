import { DataTypes, Model, type CreationOptional, type InferAttributes, type InferCreationAttributes } from "sequelize";
import { sequelize } from "../connection";
import { id, moment, optionalReference, optionalText, recordedMoment, reference, text } from "./columns";

/** The common part of everything charted; what was charted stands in the kind's own table. */
export class ChartEntry extends Model<InferAttributes<ChartEntry>, InferCreationAttributes<ChartEntry>> {
  declare id: CreationOptional<string>;
  declare submissionId: string;
  declare episodeId: string;
  /** The last segment of the route that charts it. */
  declare kind: string;
  declare chartedAt: Date;
  /** Minutes east of UTC that the bedside clock showed. */
  declare chartedOffsetMin: number;
  /** Replaced by the server's clock for every role but the owner. */
  declare recordedAt: CreationOptional<Date>;
  declare authorId: string;
  declare supersedesId: string | null;
  declare correction: "replace" | "void" | null;
  /** Why it was corrected or voided. */
  declare reason: string | null;
  declare source: CreationOptional<"person" | "file" | "device">;
}

ChartEntry.init(
  {
    id: id(),
    submissionId: reference(),
    episodeId: reference(),
    kind: text(),
    chartedAt: moment(),
    chartedOffsetMin: { type: DataTypes.SMALLINT, allowNull: false },
    recordedAt: recordedMoment(),
    authorId: reference(),
    supersedesId: optionalReference(),
    correction: optionalText(),
    reason: optionalText(),
    source: optionalText(),
  },
  { sequelize, tableName: "chart_entries" },
);
