import type { Ask, AskContext } from "./ask";
import { draftedMechanics, draftedObservations } from "./drafted-measurements";
import { draftedSettings, shownMode, shownNumber } from "./drafted-settings";
import type { Filled } from "./filled";
import type { RecordValues } from "./record-values";

/** Far beyond a limit (product: what always asks): over 1.5 times. */
const farBeyond = 1.5;
/** mL/kg, cmH2O and %: these ask even where a target covers the field. Common practice. */
const alwaysAsked = { mlPerKg: 12, plateau: 60, spo2: 60 } as const;

const beyond = (value: number, max: number | undefined) => max !== undefined && value > farBeyond * max + 1e-6;
const written = (value: number) => String(Math.round(value * 10) / 10);

function volumeAsk(field: "tidalVolumeMl" | "exhaledTidalVolumeMl", volume: number, context: AskContext): Ask | null {
  const { targets, pbwKg } = context;
  const perKg = pbwKg === null ? null : volume / pbwKg;
  const far =
    (perKg !== null && (perKg > alwaysAsked.mlPerKg + 1e-6 || beyond(perKg, targets.vtMlPerKg?.max))) ||
    beyond(volume, targets.vtMl?.max);
  if (!far) return null;
  const words = field === "tidalVolumeMl" ? "Tidal volume" : "Exhaled volume";
  const each = perKg === null ? "" : `, ${written(perKg)} mL/kg,`;
  return {
    key: `${field}=${volume}`,
    question: `${words} ${volume} mL${each} is far beyond the limit.`,
    yes: `Yes, ${volume} mL`,
  };
}

function pressureAsk(
  field: "plateauCmH2O" | "drivingPressureCmH2O" | "pressureAbovePeepCmH2O",
  value: number | null,
  max: number | undefined,
): Ask | null {
  const words = {
    plateauCmH2O: "Plateau",
    drivingPressureCmH2O: "Driving pressure",
    pressureAbovePeepCmH2O: "Pressure above PEEP",
  };
  const isFar = value !== null && (beyond(value, max) || (field === "plateauCmH2O" && value > alwaysAsked.plateau));
  if (!isFar) return null;
  return {
    key: `${field}=${value}`,
    question: `${words[field]} ${written(value)} cmH2O is far beyond what is usual or ordered.`,
    yes: `Yes, ${written(value)}`,
  };
}

function spo2Ask(spo2: number | undefined): Ask | null {
  if (spo2 === undefined || spo2 >= alwaysAsked.spo2) return null;
  return {
    key: `spo2Percent=${spo2}`,
    question: `SpO2 ${spo2} % is under ${alwaysAsked.spo2} %.`,
    yes: `Yes, ${spo2} %`,
  };
}

/** Values that ask though a target covers them. */
export function alwaysAsks(values: RecordValues, filled: Filled, context: AskContext): Ask[] {
  const { targets } = context;
  const settings = draftedSettings(values, filled);
  const reading = draftedMechanics(values);
  const plateau = reading?.plateauCmH2O ?? null;
  const mode = shownMode(values, filled);
  const floor = reading?.totalPeepCmH2O ?? shownNumber(values, filled, "peepCmH2O");
  const driving = plateau === null || floor === null || mode === null ? null : plateau - floor;
  const asks = [
    settings.tidalVolumeMl === undefined ? null : volumeAsk("tidalVolumeMl", settings.tidalVolumeMl, context),
    reading?.exhaledTidalVolumeMl === undefined
      ? null
      : volumeAsk("exhaledTidalVolumeMl", reading.exhaledTidalVolumeMl, context),
    pressureAsk("plateauCmH2O", plateau, targets.plateauCmH2O?.max),
    pressureAsk("drivingPressureCmH2O", driving, targets.drivingPressureCmH2O?.max),
    pressureAsk("pressureAbovePeepCmH2O", settings.pressureAbovePeepCmH2O ?? null, targets.drivingPressureCmH2O?.max),
    spo2Ask(draftedObservations(values)?.spo2Percent),
  ];
  return asks.filter((ask) => ask !== null);
}
