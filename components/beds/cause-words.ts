import type { BedRow } from "@/lib/contracts";
import { displayNumber } from "@/lib/format";

const metricWords: Record<string, { label: string; decimals: number }> = {
  vtMlPerKg: { label: "VT", decimals: 1 },
  plateauCmH2O: { label: "plateau", decimals: 0 },
  drivingPressureCmH2O: { label: "ΔP", decimals: 0 },
  spo2Percent: { label: "SpO2", decimals: 0 },
  pao2MmHg: { label: "PaO2", decimals: 0 },
  paco2MmHg: { label: "PaCO2", decimals: 0 },
  ph: { label: "pH", decimals: 2 },
  intrinsicPeepCmH2O: { label: "trapped gas", decimals: 0 },
};

/** Why a bed stands where it stands: 'VT 8.9, plateau 31'. */
export function causeWords(row: Pick<BedRow, "cause" | "derived">): string {
  return row.cause
    .map(({ metric }) => {
      const { label, decimals } = metricWords[metric] ?? { label: metric, decimals: 0 };
      const derived = row.derived[metric];
      const limits = [derived?.limit?.min, derived?.limit?.max].filter((limit) => limit !== undefined);
      if (derived?.value != null) {
        return `${label} ${displayNumber({ value: derived.value, decimals, limit: limits })}`;
      }
      if (derived?.lastValue != null) {
        return `${label} was ${displayNumber({ value: derived.lastValue, decimals, limit: limits })}`;
      }
      return label;
    })
    .join(", ");
}
