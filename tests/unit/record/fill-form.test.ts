import { describe, expect, it } from "vitest";
import { withEntry } from "@/components/record/draft-facts";
import { fillForm, movedSince } from "@/components/record/fill-form";
import { lateEffect } from "@/components/record/late-effect";
import type { Facts } from "@/lib/protocol/facts";
import { settingsCharted } from "../../component/record/build-worksheet";

const timeZone = "Europe/Berlin";
const author = { id: "2", name: "Mara Okafor" };
const at = (time: string) => `2026-12-01T${time}:00+01:00`;
const charted = (id: string, time: string, fields: object) => ({
  id,
  chartedAt: at(time),
  recordedAt: at(time),
  author,
  ...fields,
});
const facts: Facts = {
  settings: [charted("1", "08:00", settingsCharted), charted("2", "12:00", { peepCmH2O: 14 })],
};

describe("filling the form", () => {
  it("shows what was in force at its time, not what is now", () => {
    expect(fillForm({ facts, at: at("14:20"), timeZone }).values["peepCmH2O"]).toBe(14);
    expect(fillForm({ facts, at: at("11:00"), timeZone }).values["peepCmH2O"]).toBe(10);
    expect(fillForm({ facts, at: at("07:00"), timeZone }).values).toEqual({ mode: null });
  });

  it("tells which settings somebody charted meanwhile", () => {
    const opened = fillForm({ facts: { settings: facts.settings!.slice(0, 1) }, at: at("14:20"), timeZone });
    expect(movedSince(opened, fillForm({ facts, at: at("14:20"), timeZone }))).toEqual(["peepCmH2O"]);
  });
});

describe("an entry for an earlier time", () => {
  const effect = (settings: object) =>
    lateEffect({ facts, chartedAt: at("11:00"), settings, now: Date.parse(at("14:20")) });

  it("alters now where nobody charted the setting again since", () => {
    expect(effect({ fio2: 0.5 })).toEqual({ altersNow: ["fio2"], staysNow: [] });
  });

  it("fills history and leaves now as it is where it was charted again", () => {
    expect(effect({ peepCmH2O: 12 })).toEqual({ altersNow: [], staysNow: [{ field: "peepCmH2O", value: 14 }] });
  });

  it("stands between the entries of its time, and after one of the very same moment", () => {
    const ids = withEntry(facts, { chartedAt: at("12:00"), settings: { peepCmH2O: 12 } }).settings!.map(({ id }) => id);
    expect(ids).toEqual(["1", "2", "draft"]);
    const earlier = withEntry(facts, { chartedAt: at("11:00"), settings: { peepCmH2O: 12 } });
    expect(earlier.settings!.map(({ id }) => id)).toEqual(["1", "draft", "2"]);
  });
});
