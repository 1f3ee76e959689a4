import { z } from "zod";
import { entryKinds } from "./entries";
import { heightMethods } from "./heights";

export const authorSchema = z.object({ id: z.string(), name: z.string() });

const timesAndAuthor = { entryId: z.string(), chartedAt: z.string(), recordedAt: z.string(), author: authorSchema };

const valueOf = <Schema extends z.ZodType>(value: Schema) => z.object({ value, ...timesAndAuthor });

export const chartedValueSchema = valueOf(z.union([z.number(), z.string(), z.boolean()]));

/** One charted value with where it came from. */
export type Value = z.infer<typeof chartedValueSchema>;

export const stateSchema = z.enum(["inside", "edge", "outside", "unmeasured", "not-asked"]);
export const freshnessSchema = z.enum(["current", "due", "lapsed", "changed-since", "too-soon", "missing"]);
export const groupSchema = z.enum(["outside", "unmeasured", "edge", "inside", "not-judged", "away"]);

export const limitSchema = z.object({
  min: z.number().optional(),
  max: z.number().optional(),
  origin: z.enum(["order", "default"]),
});

export const derivedSchema = z.object({
  value: z.number().nullable(),
  lastValue: z.number().nullable(),
  lastState: stateSchema.nullable(),
  unit: z.string(),
  state: stateSchema.nullable(),
  freshness: freshnessSchema,
  changedAt: z.string().nullable(),
  changedByEntryId: z.string().nullable(),
  changedBy: z.enum(["settings", "turn", "therapy", "event"]).nullable(),
  dueAt: z.string().nullable(),
  chartedAt: z.string().nullable(),
  since: z.string().nullable(),
  limit: limitSchema.nullable(),
  band: z.string().optional(),
  notes: z.array(z.string()),
  alternatives: z.array(
    z.object({
      value: z.number().nullable(),
      chartedAt: z.string().nullable(),
      entryId: z.string().nullable(),
      note: z.string(),
    }),
  ),
  inputs: z.array(
    z.object({
      name: z.string(),
      value: z.number().nullable(),
      unit: z.string(),
      entryId: z.string().nullable(),
      chartedAt: z.string().nullable(),
      recordedAt: z.string().nullable(),
      author: authorSchema.nullable(),
    }),
  ),
  source: z.string(),
});

export type Derived = z.infer<typeof derivedSchema>;

export const findingSchema = z.object({
  metric: z.string(),
  state: stateSchema,
  value: z.number().nullable(),
  lastState: stateSchema.nullable(),
  lastValue: z.number().nullable(),
  limit: limitSchema.nullable(),
  distance: z.number().nullable(),
  freshness: freshnessSchema,
  since: z.string().nullable(),
  acknowledgement: z.object({ by: authorSchema, until: z.string(), note: z.string() }).nullable(),
});

export const nextStepSchema = z.object({
  type: z.enum(["change", "measure", "assess", "call"]),
  field: z.string().optional(),
  from: z.number().optional(),
  to: z.number().optional(),
  unit: z.string().optional(),
  reason: z.string(),
  arithmetic: z.string(),
  source: z.string(),
  cautions: z.array(z.string()),
  cancelledBy: z.array(z.string()),
  conflict: z.string().optional(),
  together: z.array(z.object({ field: z.string(), from: z.number(), to: z.number() })).optional(),
});

export const dueSchema = z.object({
  what: z.enum(["height", "hold", "spo2", "gas", "settings-check"]),
  dueAt: z.string(),
  overdue: z.boolean(),
});

/** How fresh a measured field is that has no derived number of its own. */
export const measuredFreshnessSchema = derivedSchema.pick({
  freshness: true,
  changedAt: true,
  changedByEntryId: true,
  changedBy: true,
  dueAt: true,
  chartedAt: true,
});

export const causeSchema = z.object({ metric: z.string(), state: stateSchema, lastState: stateSchema.nullable() });

const rangeSchema = z.object({ min: z.number().optional(), max: z.number().optional() });
const volumeTargetSchema = rangeSchema.extend({ goal: z.union([z.number(), rangeSchema]).nullable().optional() });

export const targetsSchema = z.object({
  set: z.string().optional(),
  recordedAt: z.string().optional(),
  origin: z.enum(["order", "default"]),
  conditions: z.array(z.string()),
  vtMlPerKg: volumeTargetSchema.nullable(),
  vtMl: volumeTargetSchema.nullable(),
  plateauCmH2O: rangeSchema.nullable(),
  drivingPressureCmH2O: rangeSchema.nullable(),
  spo2Percent: rangeSchema.nullable(),
  pao2MmHg: rangeSchema.nullable(),
  ph: rangeSchema.nullable(),
  paco2MmHg: rangeSchema.nullable(),
  respiratoryRate: rangeSchema.nullable(),
  peepTable: z.enum(["lower", "higher", "none"]),
  orderedBy: authorSchema.nullable(),
});

export const unitSchema = z.object({
  id: z.string(),
  name: z.string(),
  timeZone: z.string(),
  gasUnit: z.enum(["mmHg", "kPa"]),
  barometricPressureMmHg: z.number(),
  nursesSetVentilators: z.boolean(),
  intervals: z.record(z.string(), z.number()),
  steps: z.record(z.string(), z.number()),
});

export const heightSchema = z.object({
  heightCm: z.number(),
  method: z.enum(heightMethods),
  sexForPbw: z.enum(["male", "female"]).nullable(),
  ...timesAndAuthor,
});

export const bloodGasSchema = z.object({
  ...timesAndAuthor,
  specimen: z.literal("arterial"),
  ph: z.number().nullable(),
  paco2MmHg: z.number().nullable(),
  pao2MmHg: z.number().nullable(),
  hco3MmolPerL: z.number().nullable(),
  sao2Percent: z.number().nullable(),
  lactateMmolPerL: z.number().nullable(),
  fio2: z.object({ value: z.number().nullable(), from: z.enum(["typed", "settings"]) }),
  peepCmH2O: z.object({ value: z.number().nullable(), from: z.enum(["typed", "settings"]) }),
});

/** What this person may do here; screens ask for rights, never for roles. */
export const canSchema = z
  .object({
    settingsFields: z.array(z.string()),
    correct: z.boolean(),
    moveBed: z.boolean(),
    endEpisode: z.boolean(),
  })
  .extend(
    Object.fromEntries(entryKinds.map((kind) => [kind, z.boolean()])) as Record<
      (typeof entryKinds)[number],
      z.ZodBoolean
    >,
  );

/** Facts as the core takes them, for the live result while typing; asked for with `?facts=1`. */
export const factsSchema = z.record(z.string(), z.array(z.record(z.string(), z.unknown())));

export const worksheetSchema = z.object({
  patient: z.object({
    id: z.string(),
    name: z.string(),
    birthDate: z.string(),
    mrn: z.string(),
    ageYears: z.number().int(),
  }),
  episode: z.object({
    id: z.string(),
    intubatedAt: z.string(),
    day: z.number().int(),
    bed: z.object({ id: z.string(), label: z.string() }).nullable(),
    pausedSince: z.string().nullable(),
    endedAt: z.string().nullable(),
    pauses: z.array(z.object({ from: z.string(), until: z.string().nullable() })),
  }),
  height: heightSchema.nullable(),
  pbwKg: z.number().nullable(),
  pbwAlternatives: z.object({ male: z.number(), female: z.number() }).nullable(),
  targets: targetsSchema,
  unit: unitSchema,
  settings: z.record(z.string(), chartedValueSchema).nullable(),
  settingsCheckedAt: z.object({ value: z.string(), ...timesAndAuthor }).nullable(),
  mechanics: z.record(z.string(), chartedValueSchema).nullable(),
  observations: z.record(z.string(), chartedValueSchema).nullable(),
  bloodGas: bloodGasSchema.nullable(),
  position: z.object({ value: z.string(), ...timesAndAuthor }).nullable(),
  derived: z.record(z.string(), derivedSchema),
  findings: z.array(findingSchema),
  nextSteps: z.array(nextStepSchema),
  due: z.array(dueSchema),
  measured: z.record(z.string(), measuredFreshnessSchema).default({}),
  group: groupSchema,
  causes: z.array(causeSchema),
  validUntil: z.string().nullable(),
  at: z.string(),
  can: canSchema,
  facts: factsSchema.optional(),
});

export type Worksheet = z.infer<typeof worksheetSchema>;

export const worksheetQuerySchema = z.strictObject({
  at: z.iso.datetime({ offset: true }).optional(),
  knownAt: z.iso.datetime({ offset: true }).optional(),
  facts: z.literal("1").optional(),
});

export const chartAnswerSchema = z.object({
  submission: z.object({ id: z.string() }),
  entries: z.array(z.object({ id: z.string(), kind: z.enum(entryKinds) })),
  worksheet: worksheetSchema,
});

export type ChartAnswer = z.infer<typeof chartAnswerSchema>;
