import { UcumLhcUtils } from "@lhncbc/ucum-lhc";
import type { Inputs } from "../published-values";
import { asNumber, run, type MappedRun } from "./mapping";

const ucum = UcumLhcUtils.getInstance();

function convertByUcum(from: string, value: number, to: string): number | null {
  return ucum.convertUnitTo(from, value, to).toVal;
}

export function mapUnits(inputs: Inputs): MappedRun | null {
  if ("ucum_string" in inputs) {
    return run(() => ({ valid: ucum.validateUnitString(String(inputs.ucum_string)).status === "valid" }));
  }
  if (!("from" in inputs)) return null;
  return run(() => ({ value: convertByUcum(String(inputs.from), asNumber(inputs.value), String(inputs.to)) }));
}
