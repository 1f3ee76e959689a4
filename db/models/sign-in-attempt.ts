import { DataTypes, Model, type CreationOptional, type InferAttributes, type InferCreationAttributes } from "sequelize";
import { sequelize } from "../connection";

/** Kept by the limiter of sign-in, in the shape it expects. */
export class SignInAttempt extends Model<InferAttributes<SignInAttempt>, InferCreationAttributes<SignInAttempt>> {
  declare key: string;
  declare points: CreationOptional<number>;
  /** Epoch milliseconds. */
  declare expire: string | null;
}

SignInAttempt.init(
  {
    key: { type: DataTypes.STRING(255), primaryKey: true },
    points: { type: DataTypes.INTEGER },
    expire: { type: DataTypes.BIGINT },
  },
  { sequelize, tableName: "sign_in_attempts" },
);
