import { DataTypes, type ModelAttributeColumnOptions } from "sequelize";

/** A surrogate key that PostgreSQL gives; a string, because it may outgrow a double. */
export const id = (): ModelAttributeColumnOptions => ({
  type: DataTypes.BIGINT,
  primaryKey: true,
  autoIncrement: true,
});

export const reference = (): ModelAttributeColumnOptions => ({ type: DataTypes.BIGINT, allowNull: false });

export const optionalReference = (): ModelAttributeColumnOptions => ({ type: DataTypes.BIGINT });

export const text = (): ModelAttributeColumnOptions => ({ type: DataTypes.TEXT, allowNull: false });

export const optionalText = (): ModelAttributeColumnOptions => ({ type: DataTypes.TEXT });

export const moment = (): ModelAttributeColumnOptions => ({ type: DataTypes.DATE(3), allowNull: false });

export const optionalMoment = (): ModelAttributeColumnOptions => ({ type: DataTypes.DATE(3) });

/** Left out, the server's clock fills it: whoever may not say when, need not. */
export const recordedMoment = (): ModelAttributeColumnOptions => ({ type: DataTypes.DATE(3) });

export const flag = (): ModelAttributeColumnOptions => ({ type: DataTypes.BOOLEAN });

export const json = (): ModelAttributeColumnOptions => ({ type: DataTypes.JSONB });

/** A charted number. Names with H2O need their column spelled: `underscored` would make `_h2_o` of it. */
export const number = (field?: string): ModelAttributeColumnOptions => ({
  type: DataTypes.DECIMAL,
  ...(field && { field }),
});

/** The entry that a kind's row belongs to. */
export const entryKey = (): ModelAttributeColumnOptions => ({ type: DataTypes.BIGINT, primaryKey: true });
