import { Model, type CreationOptional, type InferAttributes, type InferCreationAttributes } from "sequelize";
import { sequelize } from "../connection";
import { flag, reference, text } from "./columns";

export class UnitMembership extends Model<InferAttributes<UnitMembership>, InferCreationAttributes<UnitMembership>> {
  declare userId: string;
  declare unitId: string;
  declare role: "therapist" | "intensivist" | "nurse";
  declare lead: CreationOptional<boolean>;
}

UnitMembership.init(
  {
    userId: { ...reference(), primaryKey: true },
    unitId: { ...reference(), primaryKey: true },
    role: text(),
    lead: flag(),
  },
  { sequelize, tableName: "unit_memberships" },
);
