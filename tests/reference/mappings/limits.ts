import { compareToLimit } from "@/lib/protocol";
import type { Inputs } from "../published-values";
import { asNumber, run, type MappedRun } from "./mapping";

const plateauWords = { "-1": "within", "0": "within", "1": "above 30" };
const drivingWords = { "-1": "within", "0": "at 15: within <=15, not within <15", "1": "above 15" };

/** Plateau against 30, where the limit itself is within; driving pressure against 15, where sources differ. */
export function mapLimits(inputs: Inputs): MappedRun {
  return run(() => ({
    pplat: plateauWords[compareToLimit(asNumber(inputs.pplat), 30)],
    dp: drivingWords[compareToLimit(asNumber(inputs.dp), 15)],
  }));
}
