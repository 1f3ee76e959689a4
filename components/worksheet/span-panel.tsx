import { PressureSpan } from "@/components/figures/pressure-span";
import { Subscripted } from "@/components/figures/subscripted";
import { DeltaP } from "@/components/figures/delta";
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
    <div className="pt-3 leading-[1.4] text-muted t-label">
      <p>
        <b className="font-[660] text-ink">{ordered ? "Ordered" : "Default"}</b>{" "}
        {ordered
          ? `${timeOfDay({ at: ordered, timeZone: unit.timeZone })}, ${targets.orderedBy?.name ?? ""}`
          : "limits of the unit, nobody has ordered others"}
      </p>
      {orderLines(targets).map((line) => (
        <p key={line}>
          <OrderLine text={line} />
        </p>
      ))}
    </div>
  );
}

function OrderLine({ text }: { text: string }) {
  const [before = "", after] = text.split("ΔP");
  if (after === undefined) return <Subscripted text={text} />;
  return (
    <>
      <Subscripted text={before} />
      <DeltaP />
      <Subscripted text={after} />
    </>
  );
}
