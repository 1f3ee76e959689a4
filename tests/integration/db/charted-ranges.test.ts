import pg from "pg";
import { afterAll, beforeAll, describe, expect, it } from "vitest";
import { buildEntry } from "../factories";
import { Height, MechanicsReading, Observation, SettingChange } from "@/db/models";
import { chartedRanges, type ChartedField, type ChartedRange } from "@/lib/physiology/limits";

/** Each model with the kind that charts its row. */
const models: [kind: string, table: string, attributes: Record<string, { field?: string }>][] = [
  ["settings", "setting_changes", SettingChange.getAttributes()],
  ["mechanics", "mechanics_readings", MechanicsReading.getAttributes()],
  ["observations", "observations", Observation.getAttributes()],
  ["heights", "heights", Height.getAttributes()],
];

/** A conventional flow and a high flow share a column: the CHECK is the union, the mode decides which one holds. */
const flow: ChartedRange = {
  ...chartedRanges.flowLPerMin,
  refuse: { min: chartedRanges.hfnoFlowLPerMin.refuse.min, max: chartedRanges.flowLPerMin.refuse.max },
};

interface Column {
  table: string;
  column: string;
  kind: string;
  range: ChartedRange;
}

const rangeOf = (field: string): ChartedRange | undefined => {
  if (field === "flowLPerMin") return flow;
  return field in chartedRanges ? chartedRanges[field as ChartedField] : undefined;
};

/** Every charted number of the models, with the range it must be held to; FiO2 in whole percent. */
const columns: Column[] = models.flatMap(([kind, table, attributes]) =>
  Object.entries(attributes).flatMap(([attribute, { field }]) => {
    const range = attribute === "fio2Percent" ? chartedRanges.fio2 : rangeOf(attribute);
    if (!range || !field) return [];
    return { table, column: field, kind, range };
  }),
);

const factor = ({ column }: Column) => (column === "fio2_percent" ? 100 : 1);
const bounds = (of: Column) => [of.range.refuse.min * factor(of), of.range.refuse.max * factor(of)] as const;
const STEP = 0.0001;

const heightMethod: Record<string, string> = {
  ulna_cm: "ulna",
  demispan_cm: "demispan",
  knee_height_cm: "knee-height",
};

/** What else a row of heights needs: the method that measures this length, and the height worked out from it. */
function heightBeside(column: string): string[][] {
  const method = heightMethod[column];
  const workedOut = method ? [["height_cm", "170"]] : [];
  return [["method", method ?? "document"], ["sex_for_pbw", "male"], ...workedOut];
}

const entryIds: Record<string, string> = {};

const client = new pg.Client({ connectionString: process.env.DATABASE_URL });

beforeAll(async () => {
  await client.connect();
  for (const [kind] of models) entryIds[kind] = (await buildEntry({ kind })).id;
});

afterAll(() => client.end());

/** Inserts one value alone, as text, and answers what was kept or the constraint that refused it. Nothing stays. */
async function answerTo({ table, column, kind }: Column, value: string): Promise<string> {
  const given = kind === "heights" ? heightBeside(column) : [];
  const all = [["entry_id", entryIds[kind]], ...given.filter(([name]) => name !== column), [column, value]];
  const names = all.map(([name]) => name).join(", ");
  const places = all.map((_, place) => `$${place + 1}`).join(", ");
  await client.query("BEGIN");
  const answer = await client
    .query<{ kept: string }>(
      `INSERT INTO ${table} (${names}) VALUES (${places}) RETURNING ${column}::text AS kept`,
      all.map(([, content]) => content),
    )
    .then(
      ({ rows }) => rows[0]?.kept ?? "nothing",
      (error: { constraint?: string; code: string }) => error.constraint ?? error.code,
    );
  await client.query("ROLLBACK");
  return answer;
}

const check = ({ table, column }: Column) => `${table}_${column}_ck`;

describe("CHECK constraints equal the refuse ranges (common practice, lib/physiology/limits)", () => {
  it("cover every charted number of settings, mechanics, observations and heights", () => {
    expect(columns.map(({ column }) => column)).toHaveLength(17 + 10 + 6 + 4);
  });

  it("leave no NUMERIC column of these tables without its range", async () => {
    const { rows: numeric } = await client.query<{ table: string; column: string; scale: number | null }>(
      `SELECT table_name AS table, column_name AS column, numeric_scale AS scale FROM information_schema.columns
        WHERE table_schema = 'public' AND data_type IN ('numeric', 'real', 'double precision') AND table_name = ANY ($1)`,
      [models.map(([, table]) => table)],
    );
    const named = new Set(columns.map(({ table, column }) => `${table}.${column}`));
    expect(numeric).toHaveLength(columns.length - 1);
    expect(numeric.filter(({ table, column }) => !named.has(`${table}.${column}`))).toEqual([]);
    expect(numeric.filter(({ scale }) => scale !== null)).toEqual([]);
  });

  it.each(columns)("$table.$column keeps its bounds and refuses what lies just outside", async (column) => {
    const [min, max] = bounds(column);
    const step = column.column === "fio2_percent" ? 1 : STEP;
    expect(Number(await answerTo(column, String(min)))).toBe(min);
    expect(Number(await answerTo(column, String(max)))).toBe(max);
    expect(await answerTo(column, String(Number((min - step).toFixed(4))))).toBe(check(column));
    expect(await answerTo(column, String(Number((max + step).toFixed(4))))).toBe(check(column));
    expect(await answerTo(column, "NaN")).toBe(column.column === "fio2_percent" ? "22P02" : check(column));
  });

  it.each(columns.filter(({ range }) => range.refuse.min > 0))(
    "$table.$column takes 0 only where zero is allowed",
    async (column) => {
      expect(await answerTo(column, "0")).toBe(column.range.zeroAllowed ? "0" : check(column));
    },
  );

  it.each(columns.filter(({ column }) => column !== "fio2_percent"))(
    "$table.$column keeps four decimals as they were charted",
    async (column) => {
      const [min] = bounds(column);
      const value = (min + 0.0125).toFixed(4);
      expect(await answerTo(column, value)).toBe(value);
    },
  );

  it("keep 30.05 as 30.05 through the model", async () => {
    await MechanicsReading.create({ entryId: entryIds.mechanics ?? "", plateauCmH2O: 30.05 });
    const read = await MechanicsReading.findByPk(entryIds.mechanics ?? "", { rejectOnEmpty: true });
    expect(read.plateauCmH2O).toBe(30.05);
  });
});

describe("cross-field CHECKs", () => {
  const mechanics = async (values: Partial<MechanicsReading>) =>
    MechanicsReading.create({ ...values, entryId: (await buildEntry({ kind: "mechanics" })).id });

  it.each([
    [{ plateauCmH2O: 32, peakCmH2O: 30 }, null],
    [{ plateauCmH2O: 32.1, peakCmH2O: 30 }, "mechanics_readings_plateau_peak_ck"],
    [{ plateauCmH2O: 12.1, totalPeepCmH2O: 12 }, null],
    [{ plateauCmH2O: 12, totalPeepCmH2O: 12 }, "mechanics_readings_plateau_total_peep_ck"],
    [{ hold: "not-possible", holdReason: "coughing" } as const, null],
    [{ hold: "not-possible" } as const, "mechanics_readings_hold_not_possible_ck"],
    [
      { hold: "not-possible", holdReason: "coughing", plateauCmH2O: 24 } as const,
      "mechanics_readings_hold_not_possible_ck",
    ],
    [{}, "mechanics_readings_something_ck"],
  ])("a reading of %o is answered by %s", async (values, constraint) => {
    const kept = mechanics(values);
    if (constraint === null) await expect(kept).resolves.toMatchObject(values);
    else await expect(kept).rejects.toThrow(constraint);
  });

  it("an entry of settings or observations that charts nothing is refused", async () => {
    const [settings, observations] = [await buildEntry({}), await buildEntry({ kind: "observations" })];
    await expect(SettingChange.create({ entryId: settings.id })).rejects.toThrow("setting_changes_something_ck");
    await expect(Observation.create({ entryId: observations.id })).rejects.toThrow("observations_something_ck");
  });

  it("a height carries the length of its method and no other, beside the height worked out from it", async () => {
    const entryId = (await buildEntry({ kind: "heights" })).id;
    const height = { entryId, sexForPbw: "female", heightCm: 164.85 } as const;
    const refused = "heights_length_of_method_ck";
    await expect(Height.create({ ...height, method: "ulna" })).rejects.toThrow(refused);
    await expect(Height.create({ ...height, method: "document", ulnaCm: 25 })).rejects.toThrow(refused);
    await expect(Height.create({ ...height, method: "ulna", ulnaCm: 25 })).resolves.toMatchObject({ ulnaCm: 25 });
  });
});
