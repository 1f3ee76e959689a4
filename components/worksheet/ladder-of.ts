import type { VolumeLadderProps } from "@/components/figures/ladder-reading";
import type { Worksheet } from "@/lib/contracts";
import { timeOfDay } from "@/lib/format";

type Sheet = Pick<Worksheet, "pbwKg" | "derived" | "settings" | "measured" | "unit">;

/** The volume ladder of a worksheet: the judged volume on this patient's millilitres. */
export function ladderOf(sheet: Sheet): Omit<VolumeLadderProps, "size"> {
  const judged = sheet.derived.vtMlPerKg;
  const perKg = judged?.unit === "mL/kg" ? judged.value : null;
  const setAlone = judged?.notes.includes("set-volume-alone") ?? false;
  const note = setAlone ? aloneWords(sheet) : undefined;
  return {
    pbwKg: sheet.pbwKg,
    order: judged?.unit === "mL/kg" ? judged.limit : null,
    reading:
      perKg === null || sheet.pbwKg === null || !judged?.state
        ? null
        : { tidalVolumeMl: perKg * sheet.pbwKg, mlPerKg: perKg, state: judged.state, set: setAlone },
    ...(note && { note }),
  };
}

/** Why only the set volume is judged: what became of the exhaled one. */
function aloneWords({ measured, unit }: Sheet): string {
  const exhaled = measured.exhaledTidalVolumeMl;
  if (exhaled?.freshness === "changed-since" && exhaled.changedAt) {
    const at = timeOfDay({ at: exhaled.changedAt, timeZone: unit.timeZone });
    return `judged on the set volume alone: exhaled volume not measured since the change at ${at}`;
  }
  return "judged on the set volume alone: exhaled volume not measured";
}
