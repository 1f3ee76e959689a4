import { describe, expect, it } from "vitest";
import { liveResult } from "@/components/record/live-result";
import { refusalsOf } from "@/components/record/refusals";
import type { Filled } from "@/components/record/filled";
import { buildWorksheet } from "../../component/record/build-worksheet";
import { buildValues, filled } from "./build-record";

const worksheet = buildWorksheet();
function live(values: Parameters<typeof buildValues>[0], from: Filled = filled) {
  const typed = buildValues(values);
  return liveResult({ worksheet, values: typed, filled: from, refusals: refusalsOf(typed, from) });
}

describe("the live result while typing", () => {
  it("V3: a plateau typed with a changed PEEP counts with the new PEEP", () => {
    const { driving } = live({
      settings: { peepCmH2O: "12" },
      mechanics: { plateauCmH2O: "27" },
      hold: "relaxed",
    });
    expect(driving).toMatchObject({ value: 15, state: "edge" });
  });

  it("F6: a changed PEEP alone leaves the old plateau not measured since", () => {
    const { driving } = live({ settings: { peepCmH2O: "12" } });
    expect(driving).toMatchObject({ value: null, lastValue: 14, freshness: "changed-since" });
  });

  it("V8: says 'if relaxed' until the hold has its word, and nothing from a hold with effort", () => {
    expect(live({ mechanics: { plateauCmH2O: "27" } })).toMatchObject({ ifRelaxed: true, driving: { value: 17 } });
    const effort = live({ mechanics: { plateauCmH2O: "27" }, hold: "effort" });
    expect(effort.ifRelaxed).toBe(false);
    expect(effort.driving?.value).toBeNull();
  });

  it("leaves out what is refused, and goes on", () => {
    const { driving, volume } = live({ mechanics: { plateauCmH2O: "9" }, settings: { tidalVolumeMl: "5" } });
    expect(driving?.value).toBe(14);
    expect(volume?.value).toBeCloseTo(420 / 70.566, 3);
  });

  it("works a late entry out at its own time", () => {
    const early = { ...filled, chartedAt: "2026-12-01T10:45:00+01:00" };
    expect(live({ settings: { peepCmH2O: "12" } }, early).driving?.changedAt).toBe("2026-12-01T09:45:00.000Z");
  });
});
