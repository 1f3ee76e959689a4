import { mechanicalPowerPressureControlJPerMin, mechanicalPowerVolumeControlJPerMin } from "@/lib/physiology";
import type { Inputs } from "../published-values";
import { asNumber, run, type MappedRun } from "./mapping";

/** The sources give driving pressure alone; any PEEP under it gives the same simplified power. */
const totalPeepCmH2O = 5;

function volumeMlOf(inputs: Inputs): number {
  return asNumber(inputs.vt_ml ?? asNumber(inputs.vt_L) * 1000);
}

function volumeControl(inputs: Inputs): MappedRun {
  return run(() => ({
    mp_J_min: mechanicalPowerVolumeControlJPerMin({
      respiratoryRate: asNumber(inputs.rr),
      tidalVolumeMl: volumeMlOf(inputs),
      peakCmH2O: asNumber(inputs.ppeak),
      plateauCmH2O: totalPeepCmH2O + asNumber(inputs.dp),
      totalPeepCmH2O,
    }),
  }));
}

function pressureControl(inputs: Inputs): MappedRun {
  return run(() => ({
    mp_J_min: mechanicalPowerPressureControlJPerMin({
      respiratoryRate: asNumber(inputs.rr),
      tidalVolumeMl: volumeMlOf(inputs),
      pressureAbovePeepCmH2O: asNumber(inputs.dp_insp),
      peepCmH2O: asNumber(inputs.peep),
    }),
  }));
}

export function mapMechanicalPower(inputs: Inputs): MappedRun | null {
  if (inputs.calc === "vcv-simplified") return volumeControl(inputs);
  if (inputs.calc === "pcv-simplified") return pressureControl(inputs);
  return null;
}
