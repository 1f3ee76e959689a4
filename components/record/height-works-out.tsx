import { heightWords } from "@/components/worksheet/height-words";
import { displayNumber } from "@/lib/format";
import { pbwHeightCm } from "@/lib/physiology";
import type { HeightCheck, HeightValues } from "./height-body";

/** Height and PBW as they follow from what is typed. */
export function HeightWorksOut({ check, values }: { check: HeightCheck; values: HeightValues }) {
  const { heightCm, pbwKg } = check;
  if (heightCm === null || !values.method) return null;
  const height = `${displayNumber({ value: heightCm, decimals: 1 })} cm`;
  return (
    <p role="status" className="t-body">
      {heightWords[values.method].estimated ? `Estimated height ${height}` : `Height ${height}`}
      {pbwKg === null
        ? ": no PBW under 120 cm, volume is ordered in mL."
        : `: PBW ${displayNumber({ value: pbwKg, decimals: 1 })} kg.`}
      {pbwKg !== null &&
        heightCm < pbwHeightCm.extrapolatedBelow &&
        ` Below ${pbwHeightCm.extrapolatedBelow} cm the line is extrapolated.`}
    </p>
  );
}
