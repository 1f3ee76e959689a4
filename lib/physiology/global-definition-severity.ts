import { berlinEdges } from "./berlin-severity";
import { derivedRanges } from "./derived-ranges";
import { ratioBand, type SeverityBand } from "./ratio-band";
import { requireCharted } from "./require-charted";
import { requireInRange } from "./require-in-range";
import { isAbove } from "./same-number";

export interface GlobalDefinitionInput {
  pfRatio?: number;
  sfRatio?: number;
  spo2Percent?: number;
  support: "invasive" | "niv-cpap" | "hfno" | "low-flow";
  peepCmH2O?: number;
  flowLPerMin?: number;
}

type Missing = "pfRatio" | "sfRatio" | "spo2Percent" | "peepCmH2O" | "flowLPerMin";

export interface GlobalDefinitionAnswer {
  category: "intubated" | "non-intubated" | "resource-limited" | "not met" | "not classifiable";
  severity: SeverityBand | "not graded" | "not usable";
  missing: Missing[];
}

const sfEdges = { severe: 148, moderate: 235, mild: 315 };
/** Above this SpO2 the S/F ratio says nothing: the dissociation curve is flat. */
const highestUsableSpo2Percent = 97;
const leastPeepCmH2O = 5;
const leastFlowLPerMin = 30;

const categoryOf = {
  invasive: "intubated",
  "niv-cpap": "non-intubated",
  hfno: "non-intubated",
  "low-flow": "resource-limited",
} as const;

const supports = Object.keys(categoryOf);

function refuseWhatCannotBe(input: GlobalDefinitionInput): void {
  if (!supports.includes(input.support)) {
    throw new RangeError(`support ${JSON.stringify(input.support)} is not known: allowed ${supports.join(", ")}`);
  }
  if (input.pfRatio !== undefined) requireInRange("pfRatio", input.pfRatio, derivedRanges.pfRatio);
  if (input.sfRatio !== undefined) requireInRange("sfRatio", input.sfRatio, derivedRanges.sfRatio);
  if (input.spo2Percent !== undefined) requireCharted("spo2Percent", input.spo2Percent);
  if (input.peepCmH2O !== undefined) requireCharted("peepCmH2O", input.peepCmH2O);
  if (input.flowLPerMin !== undefined) requireCharted("hfnoFlowLPerMin", input.flowLPerMin, "flowLPerMin");
}

/** The least support that the category asks for: met, not met, or the name of what is missing to tell. */
function supportMet(input: GlobalDefinitionInput): boolean | Missing {
  if (input.support === "niv-cpap") {
    return input.peepCmH2O === undefined ? "peepCmH2O" : !isAbove(leastPeepCmH2O, input.peepCmH2O);
  }
  if (input.support === "hfno") {
    return input.flowLPerMin === undefined ? "flowLPerMin" : !isAbove(leastFlowLPerMin, input.flowLPerMin);
  }
  return true;
}

/** P/F first where it is given, save in the resource-limited category, which is defined by S/F alone. */
function oxygenBand(input: GlobalDefinitionInput): SeverityBand | "not usable" | Missing[] {
  const { pfRatio, sfRatio, spo2Percent } = input;
  const usesPf = input.support !== "low-flow";
  if (usesPf && pfRatio !== undefined) return ratioBand(pfRatio, berlinEdges);
  if (sfRatio !== undefined && spo2Percent !== undefined) {
    return isAbove(spo2Percent, highestUsableSpo2Percent) ? "not usable" : ratioBand(sfRatio, sfEdges);
  }
  if (sfRatio !== undefined) return ["spo2Percent"];
  const absent: Missing[] = spo2Percent === undefined ? ["sfRatio", "spo2Percent"] : ["sfRatio"];
  return usesPf ? ["pfRatio", ...absent] : absent;
}

/**
 * Category and severity of the 2023 global definition, by oxygenation alone (onset and imaging are assessed by a
 * person). Only intubated patients are graded; S/F counts only at SpO2 97 % or less. HFNO needs 30 L/min, NIV or CPAP
 * 5 cmH2O; low-flow oxygen is the category for resource-limited places, where neither is asked.
 * @param input.pfRatio 10 to 3334; `sfRatio` 30 to 477 with `spo2Percent` 30 to 100
 * @param input.peepCmH2O 0 to 50 (niv-cpap); `flowLPerMin` 1 to 80 (hfno)
 * @returns `missing` names what would have to be known where nothing can be said
 * @throws RangeError outside these
 * @source Matthay, Am J Respir Crit Care Med 2024;209:37
 * @example globalDefinitionSeverity({ support: "invasive", sfRatio: 235, spo2Percent: 94 }) //=> { category: "intubated", severity: "moderate", missing: [] }
 */
export function globalDefinitionSeverity(input: GlobalDefinitionInput): GlobalDefinitionAnswer {
  refuseWhatCannotBe(input);
  const met = supportMet(input);
  if (met === false) return { category: "not met", severity: "not graded", missing: [] };
  const band = oxygenBand(input);
  const missing = [...(typeof met === "string" ? [met] : []), ...(Array.isArray(band) ? band : [])];
  if (band === "none") return { category: "not met", severity: "none", missing: [] };
  if (band === "not usable") return { category: "not classifiable", severity: "not usable", missing };
  if (Array.isArray(band) || missing.length > 0) {
    return { category: "not classifiable", severity: "not graded", missing };
  }
  const graded = input.support === "invasive";
  return { category: categoryOf[input.support], severity: graded ? band : "not graded", missing: [] };
}
