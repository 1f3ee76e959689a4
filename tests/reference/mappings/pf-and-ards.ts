import { kpaFromMmHg, mmHgFromKpa } from "@/lib/format";
import {
  altitudeAdjustedPf,
  berlinSeverity,
  globalDefinitionSeverity,
  pfRatio,
  sfRatio,
  type GlobalDefinitionAnswer,
} from "@/lib/physiology";
import type { Inputs } from "../published-values";
import { asNumber, run, type MappedRun, type Mapping } from "./mapping";

const bandWords: Readonly<Record<string, string>> = {
  "not classifiable": "not-classifiable",
  "not usable": "sf-not-usable",
};
const asPrinted = (band: string) => bandWords[band] ?? band;

function ratioOf(inputs: Inputs): number {
  return pfRatio({ pao2MmHg: asNumber(inputs.pao2_mmHg), fio2: asNumber(inputs.fio2) });
}

function berlin(inputs: Inputs): MappedRun {
  return run(() => {
    const ratio = ratioOf(inputs);
    const band = berlinSeverity({ pfRatio: ratio, peepCmH2O: asNumber(inputs.peep_or_cpap) });
    return { pf: ratio, band: asPrinted(band), ...(band === "not classifiable" && { reason: "PEEP/CPAP < 5" }) };
  });
}

function berlinKpa(inputs: Inputs): MappedRun {
  return run(() => {
    const pao2MmHg = mmHgFromKpa(asNumber(inputs.pao2_kPa));
    const ratio = pfRatio({ pao2MmHg, fio2: asNumber(inputs.fio2) });
    const band = berlinSeverity({ pfRatio: ratio, peepCmH2O: asNumber(inputs.peep_or_cpap) });
    return { pf_mmHg: ratio, pf_kPa: kpaFromMmHg(ratio), band };
  });
}

/** The printed footnote's own direction has no function: only the raw ratio and its band are checked. */
function berlinAltitudeAsPrinted(inputs: Inputs): MappedRun {
  return run(() => {
    const ratio = ratioOf(inputs);
    return {
      pf_raw: ratio,
      band_raw: berlinSeverity({ pfRatio: ratio, peepCmH2O: asNumber(inputs.peep_or_cpap) }),
    };
  });
}

/** The raw ratio whose adjusted ratio is the threshold: adjusting P/F up is scaling the threshold down. */
function scaledThreshold(threshold: number, barometricPressureMmHg: number): number {
  return (threshold * threshold) / altitudeAdjustedPf({ pfRatio: threshold, barometricPressureMmHg });
}

function trialThreshold(inputs: Inputs): MappedRun {
  return run(() => {
    const barometricPressureMmHg = asNumber(inputs.pbar_mmHg);
    const threshold = asNumber(inputs.threshold);
    return {
      scaled_threshold: scaledThreshold(threshold, barometricPressureMmHg),
      meets: altitudeAdjustedPf({ pfRatio: asNumber(inputs.pf), barometricPressureMmHg }) < threshold,
    };
  });
}

function trialDirection(inputs: Inputs): MappedRun {
  return run(() => {
    const barometricPressureMmHg = asNumber(inputs.pbar_mmHg);
    const adjusted = altitudeAdjustedPf({ pfRatio: ratioOf(inputs), barometricPressureMmHg });
    return {
      pf_raw: ratioOf(inputs),
      pf_sea_level_equiv: adjusted,
      thresholds_scaled: [300, 200, 100].map((each) => scaledThreshold(each, barometricPressureMmHg)),
      band: berlinSeverity({ pfRatio: adjusted, peepCmH2O: asNumber(inputs.peep_or_cpap) }),
    };
  });
}

function globalSf(inputs: Inputs): MappedRun {
  return run(() => {
    const spo2Percent = asNumber(inputs.spo2);
    const ratio = sfRatio({ spo2Percent, fio2: asNumber(inputs.fio2) });
    const { severity } = globalDefinitionSeverity({ support: "invasive", sfRatio: ratio, spo2Percent });
    return { sf: ratio, band: asPrinted(severity) };
  });
}

const supports = { HFNO: "hfno", "NIV/CPAP": "niv-cpap", "low-flow oxygen": "low-flow" } as const;

function categoryAsPrinted({ category }: GlobalDefinitionAnswer, sf: number | undefined): string {
  if (category === "not met") return "not met (flow < 30 L/min)";
  const detail = category === "resource-limited" ? ` (S/F ${sf} <= 315)` : "";
  return `${category} ARDS oxygenation met${detail}`;
}

function globalCategory(inputs: Inputs): MappedRun {
  return run(() => {
    const fio2 = asNumber(inputs.fio2);
    const spo2Percent = inputs.spo2 === undefined ? undefined : asNumber(inputs.spo2);
    const sf = spo2Percent === undefined ? undefined : sfRatio({ spo2Percent, fio2 });
    const answer = globalDefinitionSeverity({
      support: supports[inputs.support as keyof typeof supports],
      pfRatio: inputs.pao2_mmHg === undefined ? undefined : ratioOf(inputs),
      sfRatio: sf,
      spo2Percent,
      peepCmH2O: inputs.peep as number | undefined,
      flowLPerMin: inputs.flow_L_min as number | undefined,
    });
    return {
      category: categoryAsPrinted(answer, sf),
      severity: answer.severity === "not graded" ? null : answer.severity,
    };
  });
}

const byCalculation: Readonly<Record<string, Mapping>> = {
  berlin,
  "berlin-kPa": berlinKpa,
  "berlin-altitude-as-printed": berlinAltitudeAsPrinted,
  "trial-altitude-threshold": trialThreshold,
  "altitude-trial-direction": trialDirection,
  "global-sf": globalSf,
  "global-category": globalCategory,
};

export function mapPfAndArds(inputs: Inputs): MappedRun | null {
  if (inputs.calc === undefined) return run(() => ({ pf: ratioOf(inputs) }));
  return byCalculation[String(inputs.calc)]?.(inputs) ?? null;
}
