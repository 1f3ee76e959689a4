import { Model, type CreationOptional, type InferAttributes, type InferCreationAttributes } from "sequelize";
import { sequelize } from "../connection";
import { entryKey, optionalText } from "./columns";

/** 'Checked, unchanged': the entry's time says all of it. */
export class SettingsCheck extends Model<InferAttributes<SettingsCheck>, InferCreationAttributes<SettingsCheck>> {
  declare entryId: string;
  declare kind: CreationOptional<"settings-checks">;
}

SettingsCheck.init({ entryId: entryKey(), kind: optionalText() }, { sequelize, tableName: "settings_checks" });
