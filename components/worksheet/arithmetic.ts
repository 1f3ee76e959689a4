import { displayNumber } from "@/lib/format";
import type { Derived } from "@/lib/contracts";

type Inputs = (name: string) => number | null;

const plain = (value: number | null, decimals = 0): string =>
  value === null ? "?" : displayNumber({ value, decimals: Number.isInteger(value) ? 0 : decimals });

const litres = (millilitres: number | null): string => (millilitres === null ? "?" : (millilitres / 1000).toFixed(3));

const fraction = (value: number | null): string => (value === null ? "?" : value.toFixed(2));

/** The volume an entry judged: exhaled where one was read, else the set one. */
const volume = (input: Inputs) =>
  input("exhaledTidalVolumeMl") ?? input("tidalVolumeMl") ?? input("spontaneousTidalVolumeMl");
const endExpiratory = (input: Inputs) => input("totalPeepCmH2O") ?? input("peepCmH2O");
const rate = (input: Inputs) => input("respiratoryRateTotal") ?? input("respiratoryRate");

function driving(input: Inputs): number | null {
  const plateau = input("plateauCmH2O");
  const peep = endExpiratory(input);
  return plateau === null || peep === null ? null : plateau - peep;
}

const writers: Partial<Record<string, (input: Inputs) => string>> = {
  vtMlPerKg: (input) => `${plain(input("tidalVolumeMl") ?? volume(input))} ÷ ${plain(input("pbwKg"), 1)}`,
  minuteVolumeLPerMin: (input) => {
    if (input("minuteVolumeLPerMin") !== null) return "measured";
    const words = input("exhaledTidalVolumeMl") === null ? "set × set" : "exhaled × total rate";
    return `${words}, ${litres(volume(input))} × ${plain(rate(input))}`;
  },
  intrinsicPeepCmH2O: (input) => `${plain(input("totalPeepCmH2O"), 1)} − ${plain(input("peepCmH2O"), 1)}`,
  drivingPressureCmH2O: (input) => `${plain(input("plateauCmH2O"), 1)} − ${plain(endExpiratory(input), 1)}`,
  staticComplianceMlPerCmH2O: (input) => `${plain(volume(input))} ÷ ${plain(driving(input), 1)}`,
  dynamicComplianceMlPerCmH2O: (input) =>
    `${plain(volume(input))} ÷ (${plain(input("peakCmH2O"), 1)} − ${plain(endExpiratory(input), 1)})`,
  airwayResistanceCmH2OPerLPerS: (input) => {
    const flow = input("flowLPerMin");
    const perSecond = flow === null ? "?" : (flow / 60).toFixed(3);
    return `(${plain(input("peakCmH2O"), 1)} − ${plain(input("plateauCmH2O"), 1)}) ÷ ${perSecond}`;
  },
  mechanicalPowerJPerMin: (input) => {
    const head = `0.098 × ${plain(rate(input))} × ${litres(volume(input))}`;
    const above = input("pressureAbovePeepCmH2O");
    if (above !== null) return `${head} × (${plain(above, 1)} + ${plain(input("peepCmH2O"), 1)})`;
    const half = driving(input);
    return `${head} × (${plain(input("peakCmH2O"), 1)} − ${plain(half === null ? null : half / 2, 1)})`;
  },
  sfRatio: (input) => `${plain(input("spo2Percent"))} ÷ ${fraction(input("fio2"))}`,
  pfRatio: (input) => `${plain(input("pao2MmHg"), 1)} ÷ ${fraction(input("fio2"))}`,
  ventilatoryRatio: (input) => {
    const minute = input("minuteVolumeLPerMin");
    const millilitres = minute === null ? null : minute * 1000;
    return `${plain(millilitres)} × ${plain(input("paco2MmHg"), 1)} ÷ (${plain(input("pbwKg"), 1)} × 3750)`;
  },
  oxygenationIndex: (input) =>
    `${fraction(input("fio2"))} × ${plain(input("meanAirwayPressureCmH2O"), 1)} × 100 ÷ ${plain(input("pao2MmHg"), 1)}`,
};

/** The sum behind a number with this patient's values, as one reads it aloud: '27 − 12'. */
export function arithmeticOf(name: string, derived: Derived, pbwKg: number | null): string {
  const writer = writers[name];
  if (!writer || derived.inputs.length === 0) return "";
  const text = writer((input) =>
    input === "pbwKg" ? pbwKg : (derived.inputs.find(({ name: each }) => each === input)?.value ?? null),
  );
  return text.includes("?") ? "" : text;
}
