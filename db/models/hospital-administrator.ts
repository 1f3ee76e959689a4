import { Model, type InferAttributes, type InferCreationAttributes } from "sequelize";
import { sequelize } from "../connection";
import { reference } from "./columns";

export class HospitalAdministrator extends Model<
  InferAttributes<HospitalAdministrator>,
  InferCreationAttributes<HospitalAdministrator>
> {
  declare userId: string;
  declare hospitalId: string;
}

HospitalAdministrator.init(
  { userId: { ...reference(), primaryKey: true }, hospitalId: { ...reference(), primaryKey: true } },
  { sequelize, tableName: "hospital_administrators" },
);
