import { deadSpaceFractionEnghoff, minuteVolumeLPerMin, predictedPaco2MmHg, ventilatoryRatio } from "@/lib/physiology";
import type { Inputs } from "../published-values";
import { asNumber, run, type MappedRun, type Mapping } from "./mapping";

function minuteVentilation(inputs: Inputs): MappedRun {
  return run(() => ({
    ve_L_min: minuteVolumeLPerMin({
      tidalVolumeMl: asNumber(inputs.vt_ml),
      respiratoryRate: asNumber(inputs.rr_total),
    }),
  }));
}

function ratio(inputs: Inputs): MappedRun {
  return run(() => ({
    vr: ventilatoryRatio({
      minuteVolumeLPerMin: asNumber(inputs.ve_mL_min) / 1000,
      paco2MmHg: asNumber(inputs.paco2_mmHg),
      pbwKg: asNumber(inputs.pbw_kg),
    }),
  }));
}

function predictedPaco2(inputs: Inputs): MappedRun {
  return run(() => {
    const { vt1_ml, rr1, vt2_ml, rr2, vd_ml } = inputs;
    const alveolarLPerMin = (volumeMl: unknown, rate: unknown) =>
      (asNumber(rate) * (asNumber(volumeMl) - asNumber(vd_ml))) / 1000;
    return {
      va1_L_min: alveolarLPerMin(vt1_ml, rr1),
      va2_L_min: alveolarLPerMin(vt2_ml, rr2),
      paco2_pred: predictedPaco2MmHg({
        paco2MmHg: asNumber(inputs.paco2_mmHg),
        fromTidalVolumeMl: asNumber(vt1_ml),
        fromRespiratoryRate: asNumber(rr1),
        toTidalVolumeMl: asNumber(vt2_ml),
        toRespiratoryRate: asNumber(rr2),
        deadSpaceMl: asNumber(vd_ml),
      }),
    };
  });
}

function enghoff(inputs: Inputs): MappedRun {
  return run(() => ({
    vd_vt: deadSpaceFractionEnghoff({
      paco2MmHg: asNumber(inputs.paco2),
      mixedExpiredCo2MmHg: asNumber(inputs.peco2_mixed_expired),
    }),
  }));
}

const byCalculation: Readonly<Record<string, Mapping>> = {
  "minute-ventilation": minuteVentilation,
  "ventilatory-ratio": ratio,
  "predicted-paco2": predictedPaco2,
  enghoff,
};

export function mapVentilation(inputs: Inputs): MappedRun | null {
  return byCalculation[String(inputs.calc)]?.(inputs) ?? null;
}
