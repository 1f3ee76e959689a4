import { DataTypes, Model, type CreationOptional, type InferAttributes, type InferCreationAttributes } from "sequelize";
import { sequelize } from "../connection";
import { id, reference, text } from "./columns";

export class Patient extends Model<InferAttributes<Patient>, InferCreationAttributes<Patient>> {
  declare id: CreationOptional<string>;
  declare hospitalId: string;
  declare mrn: string;
  declare name: string;
  /** 'YYYY-MM-DD' */
  declare birthDate: string;
}

Patient.init(
  {
    id: id(),
    hospitalId: reference(),
    mrn: text(),
    name: text(),
    birthDate: { type: DataTypes.DATEONLY, allowNull: false },
  },
  { sequelize, tableName: "patients" },
);
