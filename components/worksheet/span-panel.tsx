import { PressureSpan } from "@/components/figures/pressure-span";
import { TradeText } from "@/components/figures/trade-text";
import type { Worksheet } from "@/lib/contracts";
import { timeOfDay } from "@/lib/format";
import { ColumnHead } from "./column-head";
import { orderLines } from "./order-lines";
import { spanOf } from "./span-of";

/** The pressure span, and under it the targets in force, in words. */
export function SpanPanel({ sheet, now, size }: { sheet: Worksheet; now: number; size: "large" | "medium" | "phone" }) {
  return (
    <section aria-label="Pressure span">
      <ColumnHead title="Pressure span" aside="cmH2O" />
      <div className="pt-2">
        <PressureSpan size={size} {...spanOf(sheet, now)} />
      </div>
      <OrderWords sheet={sheet} />
    </section>
  );
}

export function OrderWords({ sheet }: { sheet: Worksheet }) {
  const { targets, unit } = sheet;
  const ordered = targets.origin === "order" && targets.recordedAt;
  return (
    <div className="pt-3 t-label leading-[1.4] text-muted">
      <p>
        <b className="font-[660] text-ink">{ordered ? "Ordered" : "Default"}</b>{" "}
        {ordered
          ? `${timeOfDay({ at: ordered, timeZone: unit.timeZone })}, ${targets.orderedBy?.name ?? ""}`
          : "limits of the unit, nobody has ordered others"}
      </p>
      {orderLines(targets).map((line) => (
        <p key={line}>
          <TradeText text={line} />
        </p>
      ))}
    </div>
  );
}
