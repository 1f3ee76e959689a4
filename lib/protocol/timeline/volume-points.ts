import type { MechanicsFact, SettingsFact } from "../facts";
import { compareToLimit } from "../compare-to-limit";
import { volumePlanOf, type VolumePlan } from "../modes-asked";
import { numberInForce, type Snapshot } from "./fold-settings";
import type { Item } from "./item";

/** V6: one moment at which the volume judged was set or measured. */
export interface VolumePoint {
  t: number;
  item: Item<MechanicsFact> | Item<SettingsFact>;
  volumeMl: number;
  /** The set volume is the one judged. */
  isSet: boolean;
  /** A measured volume was read here, whichever is judged. */
  measured: boolean;
}

/** V6: exhaled and set differ by more than this share of the set volume. */
const differsBeyond = 0.1;

export function differsFromSet(exhaledMl: number, setMl: number): boolean {
  return compareToLimit(Math.abs(exhaledMl - setMl), differsBeyond * setMl) > 0;
}

/** Of set and measured the volume to judge; null where neither says. */
function volumeJudged(
  plan: VolumePlan,
  setMl: number | null,
  fact: MechanicsFact,
): { volumeMl: number; isSet: boolean } | null {
  const exhaled = fact.exhaledTidalVolumeMl ?? null;
  const beside = plan.beside === "spontaneous" ? (fact.spontaneousTidalVolumeMl ?? null) : null;
  if (plan.base === "exhaled") {
    const measured = Math.max(exhaled ?? -1, beside ?? -1);
    return measured < 0 ? null : { volumeMl: measured, isSet: false };
  }
  const measured = plan.beside === "spontaneous" ? beside : exhaled;
  if (setMl === null || measured === null) return null;
  const counts = plan.beside === "spontaneous" || differsFromSet(measured, setMl);
  const isSet = !counts || measured <= setMl;
  return { volumeMl: isSet ? setMl : measured, isSet };
}

function setPoint(snapshot: Snapshot, before: Snapshot | undefined): VolumePoint | null {
  const held = snapshot.values.tidalVolumeMl;
  if (!held || volumePlanOf(snapshot.mode)?.base !== "set") return null;
  if (held.item !== snapshot.item && before?.mode === snapshot.mode) return null;
  return { t: snapshot.t, item: snapshot.item, volumeMl: Number(held.value), isSet: true, measured: false };
}

function measuredPoint(item: Item<MechanicsFact>, snapshot: Snapshot | null): VolumePoint | null {
  const plan = snapshot ? volumePlanOf(snapshot.mode) : null;
  const judged = plan && volumeJudged(plan, numberInForce(snapshot, "tidalVolumeMl"), item.fact);
  return judged ? { t: item.t, item, ...judged, measured: true } : null;
}

/** All points ascending; at one moment settings come before readings (V3). */
export function volumePointsOf(
  snapshots: readonly Snapshot[],
  mechanics: readonly Item<MechanicsFact>[],
): VolumePoint[] {
  const points: (VolumePoint | null)[] = [];
  let next = 0;
  for (const item of mechanics) {
    for (; next < snapshots.length && snapshots[next]!.t <= item.t; next++) {
      points.push(setPoint(snapshots[next]!, snapshots[next - 1]));
    }
    points.push(measuredPoint(item, snapshots[next - 1] ?? null));
  }
  for (; next < snapshots.length; next++) points.push(setPoint(snapshots[next]!, snapshots[next - 1]));
  return points.filter((point) => point !== null);
}
