import { z } from "zod";
import { charted } from "./fields";

export const holdQualities = ["relaxed", "effort", "unsure", "not-possible"] as const;

const mechanicsShape = {
  exhaledTidalVolumeMl: charted("exhaledTidalVolumeMl").optional(),
  spontaneousTidalVolumeMl: charted("spontaneousTidalVolumeMl").optional(),
  respiratoryRateTotal: charted("respiratoryRateTotal").optional(),
  minuteVolumeLPerMin: charted("minuteVolumeLPerMin").optional(),
  peakCmH2O: charted("peakCmH2O").optional(),
  plateauCmH2O: charted("plateauCmH2O").optional(),
  hold: z.enum(holdQualities).optional(),
  holdReason: z.string().trim().min(1).max(200).optional(),
  endInspiratoryFlowZero: z.boolean().optional(),
  totalPeepCmH2O: charted("totalPeepCmH2O").optional(),
  meanAirwayPressureCmH2O: charted("meanAirwayPressureCmH2O").optional(),
  breathStacking: z.boolean().optional(),
  pesEndInspiratoryCmH2O: charted("pesEndInspiratoryCmH2O").optional(),
  pesEndExpiratoryCmH2O: charted("pesEndExpiratoryCmH2O").optional(),
};

interface HoldAndPressures {
  plateauCmH2O?: number | undefined;
  peakCmH2O?: number | undefined;
  totalPeepCmH2O?: number | undefined;
  hold?: (typeof holdQualities)[number] | undefined;
  holdReason?: string | undefined;
}

/** Cross-field refusals of one reading (bounds belong to what is accepted). */
export function mechanicsIssues(reading: HoldAndPressures): { path: string; message: string }[] {
  const issues: { path: string; message: string }[] = [];
  const { plateauCmH2O: plateau, peakCmH2O: peak, totalPeepCmH2O: totalPeep, hold, holdReason } = reading;
  if (plateau !== undefined && peak !== undefined && plateau - peak > 2 + 1e-6) {
    issues.push({
      path: "plateauCmH2O",
      message: `Plateau ${plateau} is more than 2 above peak ${peak}: check both readings.`,
    });
  }
  if (plateau !== undefined && totalPeep !== undefined && plateau - totalPeep <= 1e-6) {
    issues.push({
      path: "plateauCmH2O",
      message: `Plateau ${plateau} is not above total PEEP ${totalPeep}: check both readings.`,
    });
  }
  if (hold === "not-possible" && plateau !== undefined) {
    issues.push({
      path: "plateauCmH2O",
      message: "A hold that was not possible has no plateau: clear it or say how the hold was.",
    });
  }
  if (hold === "not-possible" && !holdReason) {
    issues.push({ path: "holdReason", message: "Say why the hold was not possible." });
  }
  return issues;
}

/** Against the set PEEP in force: total PEEP below set by up to 2 is asked on the form, more is refused. */
export function totalPeepIssue(
  totalPeep: number | undefined,
  setPeep: number | null,
): { path: string; message: string } | null {
  if (totalPeep === undefined || setPeep === null || setPeep - totalPeep <= 2 + 1e-6) return null;
  return {
    path: "totalPeepCmH2O",
    message: `Total PEEP ${totalPeep} is more than 2 below the set PEEP ${setPeep}: check both.`,
  };
}

/** Against the set PEEP where no total PEEP was measured with the plateau. */
export function plateauOverSetPeepIssue(
  reading: HoldAndPressures,
  setPeep: number | null,
): { path: string; message: string } | null {
  const { plateauCmH2O: plateau, totalPeepCmH2O: totalPeep } = reading;
  if (plateau === undefined || totalPeep !== undefined || setPeep === null || plateau - setPeep > 1e-6) return null;
  return { path: "plateauCmH2O", message: `Plateau ${plateau} is not above the set PEEP ${setPeep}: check both.` };
}

const observationsShape = {
  spo2Percent: charted("spo2Percent").optional(),
  etco2MmHg: charted("etco2MmHg").optional(),
  respiratoryRateTotal: charted("respiratoryRateTotal").optional(),
  heartRate: charted("heartRate").optional(),
  systolicMmHg: charted("systolicMmHg").optional(),
  mapMmHg: charted("mapMmHg").optional(),
};

/** An entry of a kind charts at least one of that kind's values. */
function emptyIssues(shape: object, values: object, what: string) {
  const charts = Object.entries(values).some(([name, value]) => name in shape && value !== undefined);
  return charts ? [] : [{ path: "", message: `Enter at least one ${what}.` }];
}

/** The cross-field rules of a mechanics body, with or without its key and time. */
export function checkMechanics(reading: HoldAndPressures, context: z.core.$RefinementCtx) {
  addIssues(context, [...emptyIssues(mechanicsShape, reading, "measurement"), ...mechanicsIssues(reading)]);
}

export function checkObservations(observations: object, context: z.core.$RefinementCtx) {
  addIssues(context, emptyIssues(observationsShape, observations, "observation"));
}

export function addIssues(context: z.core.$RefinementCtx, issues: readonly { path: string; message: string }[]) {
  for (const { path, message } of issues) {
    context.addIssue({ code: "custom", path: path ? [path] : [], message });
  }
}

export const mechanicsValuesSchema = z.strictObject(mechanicsShape).superRefine(checkMechanics);

export type MechanicsValues = z.infer<typeof mechanicsValuesSchema>;

export const observationsValuesSchema = z.strictObject(observationsShape).superRefine(checkObservations);

export type ObservationsValues = z.infer<typeof observationsValuesSchema>;

export const mechanicsFields = Object.keys(mechanicsShape) as (keyof typeof mechanicsShape)[];
