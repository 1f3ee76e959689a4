import { DataTypes, Model, type CreationOptional, type InferAttributes, type InferCreationAttributes } from "sequelize";
import { sequelize } from "../connection";
import { optionalMoment, reference } from "./columns";

/** Who signed in and since when: this row, never the cookie, decides how long a session lasts. */
export class Session extends Model<InferAttributes<Session>, InferCreationAttributes<Session>> {
  declare id: CreationOptional<string>;
  declare userId: string;
  declare sessionVersion: number;
  declare createdAt: CreationOptional<Date>;
  declare lastActionAt: CreationOptional<Date>;
  declare endedAt: Date | null;
}

Session.init(
  {
    id: { type: DataTypes.UUID, primaryKey: true, defaultValue: DataTypes.UUIDV4 },
    userId: reference(),
    sessionVersion: { type: DataTypes.INTEGER, allowNull: false },
    createdAt: optionalMoment(),
    lastActionAt: optionalMoment(),
    endedAt: optionalMoment(),
  },
  { sequelize, tableName: "sessions" },
);
