import type { HoldQuality, MechanicsFact, SettingsFact } from "../facts";
import { numberInForce, type Snapshot } from "./fold-settings";
import { newestUntil, type Item } from "./item";

/** V8, V9: a plateau, zero flow or `not-possible`; and P-high of APRV, which is held against the plateau's limit. */
export interface Hold {
  t: number;
  item: Item<MechanicsFact> | Item<SettingsFact>;
  /** Null where none was possible. */
  plateauCmH2O: number | null;
  quality: HoldQuality | "unsaid" | "p-high";
  zeroFlow: boolean;
  snapshot: Snapshot | null;
}

function zeroFlowPlateau(fact: MechanicsFact, snapshot: Snapshot | null): number | null {
  const quality = fact.hold ?? "relaxed";
  if (!fact.endInspiratoryFlowZero || quality !== "relaxed" || snapshot?.mode !== "A/C-PC") return null;
  const peep = numberInForce(snapshot, "peepCmH2O");
  const above = numberInForce(snapshot, "pressureAbovePeepCmH2O");
  return peep === null || above === null ? null : peep + above;
}

function holdOf(item: Item<MechanicsFact>, snapshots: readonly Snapshot[]): Hold | null {
  const { fact, t } = item;
  const snapshot = newestUntil(snapshots, t);
  if (fact.hold === "not-possible") {
    return { t, item, plateauCmH2O: null, quality: "not-possible", zeroFlow: false, snapshot };
  }
  const plateauCmH2O = fact.plateauCmH2O ?? null;
  if (plateauCmH2O !== null)
    return { t, item, plateauCmH2O, quality: fact.hold ?? "unsaid", zeroFlow: false, snapshot };
  const zeroFlow = zeroFlowPlateau(fact, snapshot);
  return zeroFlow === null ? null : { t, item, plateauCmH2O: zeroFlow, quality: "relaxed", zeroFlow: true, snapshot };
}

function pHighOf(snapshot: Snapshot): Hold | null {
  const held = snapshot.mode === "APRV" ? snapshot.values.pHighCmH2O : undefined;
  if (!held || held.item !== snapshot.item) return null;
  const { t, item } = snapshot;
  return { t, item, snapshot, plateauCmH2O: Number(held.value), quality: "p-high", zeroFlow: false };
}

/** Every hold, ascending. Total PEEP alone is none. */
export function holdsOf(mechanics: readonly Item<MechanicsFact>[], snapshots: readonly Snapshot[]): Hold[] {
  const measured = mechanics.map((item) => holdOf(item, snapshots));
  const set = snapshots.map(pHighOf);
  const holds = [...set, ...measured].filter((hold) => hold !== null);
  return set.some((hold) => hold !== null) ? holds.sort((a, b) => a.t - b.t) : holds;
}

/** V8, V9: `not-possible` charts no plateau, and in APRV P-high alone is held against its limit. */
export function isPlateau({ plateauCmH2O, quality, snapshot }: Hold): boolean {
  return plateauCmH2O !== null && (quality === "p-high" || snapshot?.mode !== "APRV");
}
