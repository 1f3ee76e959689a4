import type { MechanicsFact } from "../facts";
import type { Snapshot } from "./fold-settings";
import type { Hold } from "./holds";
import { newestUntil, type Item } from "./item";

/** V10: power takes a hold in A/C-VC, and an exhaled volume in A/C-PC and A/C-vtPC. */
export interface PowerReading {
  t: number;
  hold: Hold | null;
  item: Item<MechanicsFact> | null;
}

export function powerReadingsOf(
  holds: readonly Hold[],
  exhaled: readonly Item<MechanicsFact>[],
  snapshots: readonly Snapshot[],
): PowerReading[] {
  const modeAt = (t: number) => newestUntil(snapshots, t)?.mode;
  const held = holds
    .filter(({ plateauCmH2O, snapshot }) => plateauCmH2O !== null && snapshot?.mode === "A/C-VC")
    .map((hold): PowerReading => ({ t: hold.t, hold, item: null }));
  const breathed = exhaled
    .filter(({ t }) => modeAt(t) === "A/C-PC" || modeAt(t) === "A/C-vtPC")
    .map((item): PowerReading => ({ t: item.t, hold: null, item }));
  return breathed.length === 0 ? held : [...held, ...breathed].sort((a, b) => a.t - b.t);
}
