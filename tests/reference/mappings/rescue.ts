import { lungInjuryScore } from "@/lib/physiology";
import type { Inputs } from "../published-values";
import { asNumber, run, type MappedRun } from "./mapping";

export function mapRescue(inputs: Inputs): MappedRun | null {
  if (inputs.rule !== "murray") return null;
  return run(() => {
    const { score, components } = lungInjuryScore({
      quadrants: asNumber(inputs.cxr_quadrants),
      pfRatio: asNumber(inputs.pf),
      peepCmH2O: asNumber(inputs.peep),
      complianceMlPerCmH2O: asNumber(inputs.compliance),
    });
    return { sum: score * components, components, score, severe_gt_2_5: score > 2.5 };
  });
}
