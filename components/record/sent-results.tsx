"use client";

import { Quantity } from "@/components/figures/quantity";
import { RangeTrack } from "@/components/figures/range-track";
import { StateWord } from "@/components/figures/state-word";
import { Subscripted } from "@/components/figures/subscripted";
import type { Derived } from "@/lib/contracts";
import type { ResultWords } from "./result-words";
import { toldResults } from "./told-results";
import { useRecord } from "./use-record";

/** What the entry works out to, each on its own range. */
export function SentResults() {
  const record = useRecord();
  const { live } = record;
  const { volume, driving } = toldResults(record);
  return (
    <div className="mt-6 flex max-w-[760px] gap-4">
      <Result name="Volume per kg" metric="vtMlPerKg" derived={live.volume} words={volume} />
      <Result name="Driving pressure" metric="drivingPressureCmH2O" derived={live.driving} words={driving} divided />
    </div>
  );
}

interface ResultProps {
  name: string;
  metric: "vtMlPerKg" | "drivingPressureCmH2O";
  derived: Derived | undefined;
  words: ResultWords;
  divided?: boolean;
}

function Result({ name, metric, derived, words, divided = false }: ResultProps) {
  const { number, unit, was, state, aside, lastOutsideAt } = words;
  return (
    <section aria-label={name} className={`flex-1 ${divided ? "border-l border-hair pl-4" : ""}`}>
      <h3 className="t-label text-muted">{name}</h3>
      <p className="flex min-h-[50px] items-baseline gap-2">
        {number === null ? (
          was !== null && (
            <span className="t-body text-muted">
              was <Quantity text={was} className="text-[26px]" />
            </span>
          )
        ) : (
          <>
            <Quantity text={number} className="n-result" />
            <span className="t-body">
              <Subscripted text={unit} />
            </span>
          </>
        )}
      </p>
      {derived?.limit && derived.state && (
        <RangeTrack
          metric={metric}
          name={name}
          value={derived.value}
          lastValue={derived.lastValue}
          state={derived.state}
          lastState={derived.lastState}
          limit={derived.limit}
          width={140}
        />
      )}
      <p className="flex flex-wrap items-center gap-2 pt-1">
        <StateWord state={state} shape {...(lastOutsideAt && { lastOutsideAt })} />
        {aside && <span className="t-label text-muted">{aside}</span>}
      </p>
    </section>
  );
}
