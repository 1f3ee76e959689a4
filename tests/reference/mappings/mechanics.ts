import {
  airwayResistanceCmH2OPerLPerS,
  drivingPressureCmH2O,
  dynamicComplianceMlPerCmH2O,
  intrinsicPeepCmH2O,
  staticComplianceMlPerCmH2O,
} from "@/lib/physiology";
import type { Inputs } from "../published-values";
import { mapLimits } from "./limits";
import { asNumber, run, type MappedRun, type Mapping } from "./mapping";

function drivingAndCompliance(inputs: Inputs): MappedRun {
  return run(() => {
    const plateauCmH2O = asNumber(inputs.pplat);
    const totalPeepCmH2O = asNumber(inputs.peep_set) + asNumber(inputs.auto_peep ?? 0);
    return {
      peep_total: totalPeepCmH2O,
      dp: drivingPressureCmH2O({ plateauCmH2O, totalPeepCmH2O }),
      cstat_ml_cmH2O: staticComplianceMlPerCmH2O({
        tidalVolumeMl: asNumber(inputs.vt_ml),
        plateauCmH2O,
        totalPeepCmH2O,
      }),
    };
  });
}

function resistance(inputs: Inputs): MappedRun {
  return run(() => ({
    raw_cmH2O_s_L: airwayResistanceCmH2OPerLPerS({
      peakCmH2O: asNumber(inputs.ppeak),
      plateauCmH2O: asNumber(inputs.pplat),
      flowLPerMin: asNumber(inputs.flow_L_min),
    }),
  }));
}

function dynamicCompliance(inputs: Inputs): MappedRun {
  return run(() => ({
    cdyn: dynamicComplianceMlPerCmH2O({
      tidalVolumeMl: asNumber(inputs.vt_ml),
      peakCmH2O: asNumber(inputs.ppeak),
      totalPeepCmH2O: asNumber(inputs.peep_total),
    }),
  }));
}

function trappedGas(inputs: Inputs): MappedRun {
  return run(() => ({
    auto_peep: intrinsicPeepCmH2O({
      totalPeepCmH2O: asNumber(inputs.peep_total),
      peepCmH2O: asNumber(inputs.peep_set),
    }),
  }));
}

const byCalculation: Readonly<Record<string, Mapping>> = {
  "dp-cstat": drivingAndCompliance,
  resistance,
  cdyn: dynamicCompliance,
  "auto-peep": trappedGas,
  limits: mapLimits,
};

export function mapMechanics(inputs: Inputs): MappedRun | null {
  if (inputs.calc === undefined) return "flow_L_min" in inputs ? resistance(inputs) : drivingAndCompliance(inputs);
  return byCalculation[String(inputs.calc)]?.(inputs) ?? null;
}
