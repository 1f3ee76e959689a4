import { heightFromDemispanCm, heightFromKneeHeightCm, heightFromUlnaCm } from "@/lib/physiology";
import type { Inputs } from "../published-values";
import { asNumber, run, type MappedRun } from "./mapping";
import { sexOf } from "./sex";

/** An age inside each printed band; the upper bands at the age where they begin. */
const agesOfBands: Readonly<Record<string, number>> = { "<65": 64, ">=65": 65, "16-54": 54, ">=55": 55 };

function heightCmOf(inputs: Inputs): number | null {
  const sex = sexOf(inputs.sex);
  const ageYears = asNumber(agesOfBands[String(inputs.age_band)] ?? inputs.age_y ?? inputs.age_band);
  switch (inputs.method) {
    case "ulna":
    case "ulna-equation":
      return heightFromUlnaCm({ sex, ageYears, ulnaCm: asNumber(inputs.ulna_cm) });
    case "demispan-must":
      return heightFromDemispanCm({ sex, ageYears, demispanCm: asNumber(inputs.demispan_cm) });
    case "knee-height":
      return heightFromKneeHeightCm({ sex, ageYears, kneeHeightCm: asNumber(inputs.knee_cm) });
    default:
      return null;
  }
}

export function mapHeightSurrogate(inputs: Inputs): MappedRun | null {
  if (inputs.method === "demispan-bassey") return null;
  return run(() => {
    const heightCm = heightCmOf(inputs);
    // The ulna table is printed in metres, the equations in centimetres.
    return inputs.method === "ulna" ? { height_m: asNumber(heightCm) / 100 } : { height_cm: heightCm };
  });
}
