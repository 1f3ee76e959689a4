import { describe, expect, it } from "vitest";
import { mergeValues } from "@/components/record/merge-values";
import { buildValues } from "./build-record";

describe("typed work that comes back beside newer work", () => {
  it("loses nothing of either, and the later word stands", () => {
    const refused = buildValues({ settings: { peepCmH2O: "12" }, reason: "Intensivist asked", confirmed: ["a"] });
    const typedSince = buildValues({ mechanics: { plateauCmH2O: "27" }, hold: "relaxed", confirmed: ["b"] });
    expect(mergeValues(refused, typedSince)).toMatchObject({
      settings: { peepCmH2O: "12" },
      mechanics: { plateauCmH2O: "27" },
      hold: "relaxed",
      reason: "Intensivist asked",
      confirmed: ["a", "b"],
    });
    expect(mergeValues(refused, buildValues({ settings: { peepCmH2O: "14" } })).settings).toEqual({ peepCmH2O: "14" });
  });
});
