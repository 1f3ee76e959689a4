import {
  DataTypes,
  Model,
  type CreationOptional,
  type InferAttributes,
  type InferCreationAttributes,
  type Range,
} from "sequelize";
import { sequelize } from "../connection";
import { id, reference } from "./columns";

export class BedStay extends Model<InferAttributes<BedStay>, InferCreationAttributes<BedStay>> {
  declare id: CreationOptional<string>;
  declare episodeId: string;
  declare bedId: string;
  /** From its start inclusive to its end exclusive; open where the patient lies there now. */
  declare during: Range<Date> | [from: Date, until: Date | null];
}

BedStay.init(
  {
    id: id(),
    episodeId: reference(),
    bedId: reference(),
    during: { type: DataTypes.RANGE(DataTypes.DATE), allowNull: false },
  },
  { sequelize, tableName: "bed_stays" },
);
