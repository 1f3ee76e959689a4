import { heightShape, mechanicsFields, observationsValuesSchema, type EntryKind } from "@/lib/contracts";
import { settingFields } from "@/lib/physiology";

interface DetailTable {
  table: string;
  /** What a body of this kind holds, each with its column. */
  columnOf: ReadonlyMap<string, string>;
  fieldOf: ReadonlyMap<string, string>;
}

function columnName(field: string): string {
  if (field === "fio2") return "fio2_percent";
  return field.replace("CmH2O", "_cm_h2o").replace(/[A-Z]/g, (letter) => `_${letter.toLowerCase()}`);
}

function detailTable(table: string, fields: readonly string[]): DetailTable {
  const pairs = fields.map((field) => [field, columnName(field)] as const);
  return { table, columnOf: new Map(pairs), fieldOf: new Map(pairs.map(([field, column]) => [column, field])) };
}

/** Where each kind's own values stand. */
export const detailTables: Record<EntryKind, DetailTable> = {
  settings: detailTable("setting_changes", ["mode", ...settingFields, "reason"]),
  "settings-checks": detailTable("settings_checks", []),
  mechanics: detailTable("mechanics_readings", mechanicsFields),
  observations: detailTable("observations", Object.keys(observationsValuesSchema.shape)),
  heights: detailTable("heights", [...Object.keys(heightShape), "reason"]),
};

/** A detail row, as `to_jsonb` gives it, under the body's names; FiO2 becomes the fraction it was charted as. */
export function bodyOf(kind: EntryKind, row: Record<string, unknown>): Record<string, unknown> {
  const { fieldOf } = detailTables[kind];
  const body: Record<string, unknown> = {};
  for (const [column, value] of Object.entries(row)) {
    const field = fieldOf.get(column);
    if (field && value !== null) body[field] = field === "fio2" ? Number(value) / 100 : value;
  }
  return body;
}

/** A body's values under the model's names; FiO2 becomes whole percent. */
export function detailOf(kind: EntryKind, body: Record<string, unknown>): Record<string, unknown> {
  const charted = Object.entries(body).filter(
    ([field, value]) => detailTables[kind].columnOf.has(field) && value !== undefined,
  );
  return Object.fromEntries(
    charted.map(([field, value]) =>
      field === "fio2" ? ["fio2Percent", Math.round(Number(value) * 100)] : [field, value],
    ),
  );
}
