import { overTheMark, type Mark } from "./over-the-mark";
import type { LowWater, SpanLimits, SpanReading } from "./span-reading";

/** What both spans draw between low and high water, in cmH2O. */
export interface SpanShape {
  base: number;
  plateau: number;
  peak: number | null;
  mark: Mark;
  /** Hatched and dashed: not to be read as true now. */
  hatched: boolean;
  /** The peak is of an old hold too. */
  peakHatched: boolean;
  /** The block above the mark is solid only where the plateau itself is known to be over it. */
  capHatched: boolean;
}

/** The bar of a reading that has one; null for what is drawn as a line, an outline or words. */
export function spanShape(reading: SpanReading, lowWater: LowWater | null, limits: SpanLimits): SpanShape | null {
  const base = reading.kind === "unmeasured" ? reading.basePeep : (lowWater?.value ?? 0);
  const plateauAlone = { plateau: limits.plateau, driving: null };
  switch (reading.kind) {
    case "measured": {
      const edge = reading.plateauState === "edge" || reading.drivingState === "edge";
      const mark = overTheMark({ basePeep: base, plateau: reading.plateau, limits, edge });
      return { ...ends(base, reading), mark, hatched: false, peakHatched: false, capHatched: false };
    }
    case "unmeasured": {
      const over = overTheMark({ basePeep: base, plateau: reading.plateau, limits });
      const mark = reading.lastOutside ? blockOnly(over) : none(over);
      return { ...ends(base, reading), mark, hatched: true, peakHatched: true, capHatched: true };
    }
    case "draft":
    case "effort": {
      const mark = blockOnly(overTheMark({ basePeep: base, plateau: reading.plateau, limits: plateauAlone }));
      const capHatched = reading.kind === "draft";
      return { ...ends(base, reading), mark, hatched: true, peakHatched: false, capHatched };
    }
    default:
      return null;
  }
}

function ends(base: number, { plateau, peak }: { plateau: number; peak?: number | null }) {
  return { base, plateau, peak: peak ?? null };
}

/** On a hatched bar a lip would claim a fresh edge. */
function blockOnly(mark: Mark): Mark {
  return mark.cap === "block" ? mark : none(mark);
}

function none(mark: Mark): Mark {
  return { ...mark, cap: "none" };
}
