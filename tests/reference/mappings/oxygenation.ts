import {
  alveolarArterialGradientMmHg,
  alveolarPo2MmHg,
  oxygenationIndex,
  oxygenSaturationIndex,
  roxIndex,
} from "@/lib/physiology";
import type { Inputs } from "../published-values";
import { asNumber, run, type MappedRun, type Mapping } from "./mapping";

function alveolarGas(inputs: Inputs): MappedRun {
  return run(() => {
    const gas = {
      fio2: asNumber(inputs.fio2),
      paco2MmHg: asNumber(inputs.paco2),
      barometricPressureMmHg: asNumber(inputs.pbar),
      respiratoryQuotient: asNumber(inputs.R),
    };
    return {
      PAO2: alveolarPo2MmHg(gas),
      Aa: alveolarArterialGradientMmHg({ ...gas, pao2MmHg: asNumber(inputs.pao2) }),
    };
  });
}

function byPao2(inputs: Inputs): MappedRun {
  return run(() => ({
    OI: oxygenationIndex({
      fio2: asNumber(inputs.fio2),
      meanAirwayPressureCmH2O: asNumber(inputs.mpaw),
      pao2MmHg: asNumber(inputs.pao2),
    }),
  }));
}

function bySpo2(inputs: Inputs): MappedRun {
  return run(() => ({
    OSI: oxygenSaturationIndex({
      fio2: asNumber(inputs.fio2),
      meanAirwayPressureCmH2O: asNumber(inputs.mpaw),
      spo2Percent: asNumber(inputs.spo2_percent),
    }),
  }));
}

function rox(inputs: Inputs): MappedRun {
  return run(() => ({
    rox: roxIndex({
      spo2Percent: asNumber(inputs.spo2_percent),
      fio2: asNumber(inputs.fio2),
      respiratoryRate: asNumber(inputs.rr),
    }),
  }));
}

const byCalculation: Readonly<Record<string, Mapping>> = {
  "alveolar-gas-short": alveolarGas,
  OI: byPao2,
  OSI: bySpo2,
  ROX: rox,
};

export function mapOxygenation(inputs: Inputs): MappedRun | null {
  return byCalculation[String(inputs.calc)]?.(inputs) ?? null;
}
