import { Model, type CreationOptional, type InferAttributes, type InferCreationAttributes } from "sequelize";
import { sequelize } from "../connection";
import { id, moment, optionalMoment, reference } from "./columns";

/** The patient is away from the unit: nothing is due. Open until resumed. */
export class EpisodePause extends Model<InferAttributes<EpisodePause>, InferCreationAttributes<EpisodePause>> {
  declare id: CreationOptional<string>;
  declare episodeId: string;
  declare pausedAt: Date;
  declare resumedAt: Date | null;
}

EpisodePause.init(
  { id: id(), episodeId: reference(), pausedAt: moment(), resumedAt: optionalMoment() },
  { sequelize, tableName: "episode_pauses" },
);
