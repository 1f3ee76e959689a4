import type { Worksheet } from "@/lib/contracts";
import { evaluate, settingsInForce, type Facts } from "@/lib/protocol";
import { buildWorksheet } from "../record/build-worksheet";

const author = { id: "2", name: "Mara Okafor" };

/** One fact charted by an invented therapist. */
export function fact<Fields extends object>(id: string, chartedAt: string, fields: Fields) {
  return { id, chartedAt, recordedAt: chartedAt, author, ...fields };
}

export const at = (time: string) => `2026-12-01T${time}:00+01:00`;

export const firstSettings = fact("101", at("10:00"), {
  mode: "A/C-VC" as const,
  tidalVolumeMl: 420,
  respiratoryRate: 24,
  peepCmH2O: 10,
  fio2: 0.6,
  inspiratoryTimeS: 0.8,
  flowLPerMin: 45,
  flowPattern: "square" as const,
});

export const firstReading = fact("102", at("10:30"), {
  plateauCmH2O: 24,
  hold: "relaxed" as const,
  totalPeepCmH2O: 10,
  peakCmH2O: 31,
  exhaledTidalVolumeMl: 415,
  respiratoryRateTotal: 24,
});

export const tapeHeight = fact("90", at("08:00"), {
  heightCm: 175,
  method: "measured-lying" as const,
  sexForPbw: "male" as const,
});

export const firstFacts: Facts = {
  settings: [firstSettings],
  mechanics: [firstReading],
  observations: [fact("103", at("12:00"), { spo2Percent: 93 })],
  heights: [tapeHeight],
};

const { body: _body, ...ignored } = { body: null, id: 0, chartedAt: 0, recordedAt: 0, author: 0 };

/** Newest value of each field, with where it came from, as the worksheet carries it. */
function newest(readings: readonly { id: string; chartedAt: unknown; recordedAt: unknown }[] = []) {
  const values: NonNullable<Worksheet["mechanics"]> = {};
  for (const reading of readings) {
    const origin = {
      entryId: reading.id,
      chartedAt: String(reading.chartedAt),
      recordedAt: String(reading.recordedAt),
      author,
    };
    for (const [field, value] of Object.entries(reading)) {
      if (!(field in ignored)) values[field] = { value: value as number, ...origin };
    }
  }
  return Object.keys(values).length === 0 ? null : values;
}

/** A worksheet as the server would answer it: the real core's judgement of these facts at this moment. */
export function judgedWorksheet(facts: Facts, now = at("12:40"), overrides: Partial<Worksheet> = {}): Worksheet {
  const base = buildWorksheet({ at: now, ...overrides });
  const { targets, unit, episode } = base;
  const judged = evaluate({ targets: targets as never, unit, episode, facts, at: now });
  const inForce = settingsInForce({ changes: facts.settings ?? [], at: now });
  return {
    ...base,
    settings: facts.settings?.length ? (JSON.parse(JSON.stringify(inForce)) as Worksheet["settings"]) : null,
    mechanics: newest(facts.mechanics),
    observations: newest(facts.observations),
    ...(judged as unknown as Pick<Worksheet, "derived" | "findings" | "due" | "measured" | "group" | "causes">),
    ...overrides,
  };
}
