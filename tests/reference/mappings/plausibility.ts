import { isRefused, isUnusual, type ChartedField } from "@/lib/physiology";
import type { Inputs } from "../published-values";
import { asNumber, run, type MappedRun } from "./mapping";

const fields: Readonly<Record<string, ChartedField>> = {
  fio2_fraction: "fio2",
  peep_set_cmH2O: "peepCmH2O",
  vt_ml: "tidalVolumeMl",
  rr_set_per_min: "respiratoryRate",
  pplat_cmH2O: "plateauCmH2O",
  pH: "ph",
  paco2_mmHg: "paco2MmHg",
  pao2_mmHg: "pao2MmHg",
  spo2_percent: "spo2Percent",
  temp_C: "temperatureC",
  height_cm: "heightCm",
};

function verdictOf(field: ChartedField, value: number): "refuse" | "warn" | "accept" {
  if (isRefused(field, value)) return "refuse";
  return isUnusual(field, value) ? "warn" : "accept";
}

export function mapPlausibility(inputs: Inputs): MappedRun | null {
  const field = fields[String(inputs.field)];
  if (!field) return null;
  return run(() => ({ verdict: verdictOf(field, asNumber(inputs.value)) }));
}
