import { fieldsOfMode, type NumericSettingField, type VentilationMode } from "../physiology/modes";
import type { Range, Targets } from "./targets";

/** Differences below this are equal (rules S1). */
const EQUAL_WITHIN = 1e-6;

/** Settings in force for one mode; what is not set is null or left out. Volumes mL, pressures cmH2O. */
export type JudgedSettings = { mode?: VentilationMode | null } & Partial<
  Record<Extract<NumericSettingField, "tidalVolumeMl" | "pressureAbovePeepCmH2O" | "peepCmH2O">, number | null>
>;

/** A setting that leaves the order: `from` is null where nothing was set before. */
export interface OrderDeparture {
  metric: "vtMlPerKg" | "vtMl" | "plateauCmH2O" | "drivingPressureCmH2O";
  from: number | null;
  to: number;
  limit: Range;
}

interface Judged {
  metric: OrderDeparture["metric"];
  limit: Range;
  /** A set volume this close to its limit counts as on it (half a machine step, rules S2). */
  tolerance: number;
  valueOf(settings: JudgedSettings): number | null;
}

function setValue(settings: JudgedSettings, field: "tidalVolumeMl" | "pressureAbovePeepCmH2O"): number | null {
  if (!settings.mode || !fieldsOfMode(settings.mode).has(field)) return null;
  return settings[field] ?? null;
}

function judgedVolume(targets: Targets, pbwKg: number | null, tidalVolumeStepMl: number): Judged[] {
  const volumeMl = (settings: JudgedSettings) => setValue(settings, "tidalVolumeMl");
  const halfStepMl = tidalVolumeStepMl / 2;
  if (targets.vtMl) return [{ metric: "vtMl", limit: targets.vtMl, tolerance: 0, valueOf: volumeMl }];
  if (!targets.vtMlPerKg || pbwKg === null) return [];
  const valueOf = (settings: JudgedSettings) => {
    const volume = volumeMl(settings);
    return volume === null ? null : volume / pbwKg;
  };
  return [{ metric: "vtMlPerKg", limit: targets.vtMlPerKg, tolerance: halfStepMl / pbwKg, valueOf }];
}

function judgedPressures(targets: Targets): Judged[] {
  const abovePeep = (settings: JudgedSettings) => setValue(settings, "pressureAbovePeepCmH2O");
  const endInspiratory = (settings: JudgedSettings) => {
    const pressure = abovePeep(settings);
    return pressure === null || settings.peepCmH2O == null ? null : pressure + settings.peepCmH2O;
  };
  const judged: Judged[] = [];
  if (targets.plateauCmH2O)
    judged.push({ metric: "plateauCmH2O", limit: targets.plateauCmH2O, tolerance: 0, valueOf: endInspiratory });
  if (targets.drivingPressureCmH2O)
    judged.push({
      metric: "drivingPressureCmH2O",
      limit: targets.drivingPressureCmH2O,
      tolerance: 0,
      valueOf: abovePeep,
    });
  return judged;
}

/** How far outside: negative below the range, positive above it, 0 inside or on a limit. */
function outsideBy(value: number | null, { limit, tolerance }: Judged): number {
  if (value === null) return 0;
  const below = limit.min === undefined ? 0 : value - limit.min;
  const above = limit.max === undefined ? 0 : value - limit.max;
  if (below < -(tolerance + EQUAL_WITHIN)) return below;
  return above > tolerance + EQUAL_WITHIN ? above : 0;
}

/**
 * Which settings leave the order (or the default where there is none), or go further out of it: for these a reason is
 * asked. Volume in mL/kg PBW, or in mL where it is ordered so; pressure only where pressure is set (A/C-PC, SIMV-PC):
 * PEEP + pressure above PEEP against the plateau limit, pressure above PEEP against the driving pressure limit.
 * Crossing to the other side of a range leaves it again. Nothing is judged under the condition comfort, nor a volume in
 * mL/kg without PBW. The first settings leave the order as any others do. Never throws.
 * @example settingsLeaveOrder({ targets, pbwKg: 70.566, before: { mode: "A/C-VC", tidalVolumeMl: 420 }, after: { mode: "A/C-VC", tidalVolumeMl: 600 } }) //=> [{ metric: "vtMlPerKg", from: 5.95, to: 8.50, limit }]
 */
export function settingsLeaveOrder({
  targets,
  pbwKg,
  before,
  after,
  tidalVolumeStepMl = 10,
}: {
  targets: Targets;
  pbwKg: number | null;
  before: JudgedSettings | null;
  after: JudgedSettings;
  tidalVolumeStepMl?: number;
}): OrderDeparture[] {
  if (targets.conditions.includes("comfort")) return [];
  return [...judgedVolume(targets, pbwKg, tidalVolumeStepMl), ...judgedPressures(targets)].flatMap((judged) => {
    const from = before ? judged.valueOf(before) : null;
    const to = judged.valueOf(after);
    const [was, is] = [outsideBy(from, judged), outsideBy(to, judged)];
    const leaves = is !== 0 && (Math.sign(is) !== Math.sign(was) || Math.abs(is) > Math.abs(was) + EQUAL_WITHIN);
    return leaves && to !== null ? [{ metric: judged.metric, from, to, limit: judged.limit }] : [];
  });
}
