import { rapidShallowBreathingIndex } from "@/lib/physiology";
import type { Inputs } from "../published-values";
import { asNumber, run, type MappedRun } from "./mapping";

export function mapArdsNetwork(inputs: Inputs): MappedRun | null {
  if (inputs.rule !== "rsbi") return null;
  return run(() => ({
    rsbi: rapidShallowBreathingIndex({
      respiratoryRate: asNumber(inputs.rr),
      tidalVolumeMl: asNumber(inputs.vt_ml ?? asNumber(inputs.vt_L) * 1000),
    }),
  }));
}
