import type { Worksheet } from "@/lib/contracts";
import { displayNumber, inwardMillilitres } from "@/lib/format";
import type { OrderDeparture } from "@/lib/protocol/settings-leave-order";

type Order = Pick<Worksheet, "pbwKg" | "targets">;

function rangeText(min: number | undefined, max: number | undefined): string {
  const write = (value: number) => displayNumber({ value, decimals: Number.isInteger(value) ? 0 : 1 });
  if (min !== undefined && max !== undefined) return `${write(min)} to ${write(max)}`;
  return max === undefined ? `at least ${write(min ?? 0)}` : `up to ${write(max)}`;
}

function limitText({ metric, limit }: OrderDeparture, { pbwKg }: Order): string {
  const { min, max } = limit;
  if (metric === "vtMlPerKg" && pbwKg !== null && max !== undefined) {
    const { minMl, maxMl } = inwardMillilitres({
      maxMlPerKg: max,
      pbwKg,
      ...(min !== undefined && { minMlPerKg: min }),
    });
    return `${rangeText(minMl, maxMl)} mL`;
  }
  const text = rangeText(min, max);
  if (metric === "plateauCmH2O") return `plateau ${text} cmH2O`;
  if (metric === "drivingPressureCmH2O") return `driving pressure ${text} cmH2O`;
  return metric === "vtMl" ? `${text} mL` : `${text} mL/kg`;
}

/** 'Ordered 353 to 493 mL.': what the settings leave, in the ventilator's own unit; mL round inward. */
export function orderWords(departures: readonly OrderDeparture[], order: Order): string {
  const word = order.targets.origin === "order" ? "Ordered" : "Unit default";
  return `${word} ${departures.map((departure) => limitText(departure, order)).join(", ")}.`;
}
