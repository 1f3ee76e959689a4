import type { Facts, SettingsFact } from "@/lib/protocol";
import { fact } from "./chart";

/**
 * Invented: a passive lung of one compartment on volume control, with a person who charts. Enough to tell a story of a
 * day whose true pressures are known at every minute.
 */
export interface Lung {
  complianceMlPerCmH2O: number;
  resistanceCmH2OPerLPerS: number;
}

interface Setting {
  tidalVolumeMl: number;
  peepCmH2O: number;
  respiratoryRate: number;
  fio2: number;
  flowLPerMin: number;
}

const plateauOf = (lung: Lung, { tidalVolumeMl, peepCmH2O }: Setting) =>
  peepCmH2O + tidalVolumeMl / lung.complianceMlPerCmH2O;

const rounded = (value: number) => Math.round(value * 10) / 10;

/** What one minute of the day brings: a change of settings, a reading, or both in one entry. */
export interface Doing {
  at: string;
  change?: Partial<Setting>;
  hold?: "relaxed" | "effort";
  spo2?: number;
  exhaled?: boolean;
}

const begins: Setting = { tidalVolumeMl: 480, peepCmH2O: 8, respiratoryRate: 20, fio2: 0.6, flowLPerMin: 60 };

function reading(lung: Lung, setting: Setting, { at, hold, exhaled }: Doing) {
  if (!hold && !exhaled) return [];
  const plateau = rounded(plateauOf(lung, setting));
  const peak = rounded(plateau + (lung.resistanceCmH2OPerLPerS * setting.flowLPerMin) / 60);
  const held = hold ? { plateauCmH2O: hold === "effort" ? plateau - 3 : plateau, hold, peakCmH2O: peak } : {};
  return [fact(at, { ...held, ...(exhaled ? { exhaledTidalVolumeMl: setting.tidalVolumeMl - 5 } : {}) })];
}

/** The chart of a day. */
export function chartDay(lung: Lung, doings: readonly Doing[]): Facts {
  let setting = begins;
  const settings: SettingsFact[] = [fact("06:00", { mode: "A/C-VC" as const, ...begins, inspiratoryTimeS: 0.8 })];
  const mechanics: ReturnType<typeof reading> = [];
  const observations: ReturnType<typeof fact<{ spo2Percent: number }>>[] = [];
  for (const doing of doings) {
    if (doing.change) {
      setting = { ...setting, ...doing.change };
      settings.push(fact(doing.at, doing.change));
    }
    mechanics.push(...reading(lung, setting, doing));
    if (doing.spo2 !== undefined) observations.push(fact(doing.at, { spo2Percent: doing.spo2 }));
  }
  return { settings, mechanics, observations };
}
