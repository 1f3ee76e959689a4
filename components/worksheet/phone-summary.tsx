import { PressureSpan } from "@/components/figures/pressure-span";
import { Quantity } from "@/components/figures/quantity";
import { StateWord } from "@/components/figures/state-word";
import { VolumeLadder } from "@/components/figures/volume-ladder";
import type { Derived, Worksheet } from "@/lib/contracts";
import { displayNumber } from "@/lib/format";
import { lastOutsideTime } from "./freshness-of";
import { ladderOf } from "./ladder-of";
import { OrderWords } from "./span-panel";
import { spanOf } from "./span-of";
import { rangeWords } from "./order-lines";

/** The top of the worksheet on a phone: volume and its ladder, then the span beside driving pressure and P/F. */
export function PhoneSummary({ sheet, now }: { sheet: Worksheet; now: number }) {
  const volume = sheet.derived.vtMlPerKg;
  const driving = sheet.derived.drivingPressureCmH2O;
  const ordered = rangeWords(volume?.limit);
  return (
    <div className="pt-3 tablet:hidden">
      <div className="flex flex-wrap items-baseline gap-x-3">
        <Result value={volume?.value ?? null} decimals={1} unit={volume?.unit ?? "mL/kg"} limit={volume?.limit} />
        <PhoneState derived={volume} clock={{ now, timeZone: sheet.unit.timeZone }} />
        {ordered && (
          <span className="t-label text-muted">
            {volume?.limit?.origin === "order" ? "ordered" : "default"} {ordered}
          </span>
        )}
      </div>
      <VolumeLadder size="phone" {...ladderOf(sheet)} />
      <div className="flex flex-wrap gap-4 pt-3">
        <PressureSpan size="phone" {...spanOf(sheet, now)} />
        <div className="min-w-[130px] flex-1">
          <p className="t-label text-muted">Driving pressure</p>
          <Result value={driving?.value ?? null} decimals={0} unit="cmH2O" limit={driving?.limit} />
          <PhoneState derived={driving} clock={{ now, timeZone: sheet.unit.timeZone }} />
          <OrderWords sheet={sheet} />
        </div>
      </div>
    </div>
  );
}

function PhoneState({ derived, clock }: { derived: Derived | undefined; clock: { now: number; timeZone: string } }) {
  if (!derived) return null;
  const lastOutsideAt = lastOutsideTime(derived, clock);
  return <StateWord state={derived.state} shape {...(lastOutsideAt && { lastOutsideAt })} />;
}

interface ResultProps {
  value: number | null;
  decimals: number;
  unit: string;
  limit: { min?: number | undefined; max?: number | undefined } | null | undefined;
}

function Result({ value, decimals, unit, limit }: ResultProps) {
  if (value === null) return null;
  const limits = [limit?.min, limit?.max].filter((each) => each !== undefined);
  return (
    <p>
      <Quantity text={displayNumber({ value, decimals, limit: limits })} className="n-result" />{" "}
      <span className="t-body text-muted">{unit}</span>
    </p>
  );
}
