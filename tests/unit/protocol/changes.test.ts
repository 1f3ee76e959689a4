import { describe, expect, it } from "vitest";
import { fact, metric, moment, pressureControl, relaxed, settings, spo2, volumeControl } from "./chart";

const { flowLPerMin: _flow, ...withoutFlow } = volumeControl;
const { inspiratoryTimeS: _time, ...withoutTime } = volumeControl;

const plateauAfter = (begins: object, ...changes: object[]) =>
  metric("plateauCmH2O", "11:00", {
    facts: {
      settings: [settings("08:00", begins), ...changes.map((body) => settings("10:30", body))],
      mechanics: [relaxed("10:00", 24)],
    },
  });

describe("what a change is", () => {
  it("V2 the same value charted again is no change, a difference under 1e-6 neither", () => {
    expect(plateauAfter(volumeControl, { peepCmH2O: 10 }).freshness).toBe("current");
    expect(plateauAfter(volumeControl, { peepCmH2O: 10.0000005 }).freshness).toBe("current");
    expect(plateauAfter(volumeControl, { peepCmH2O: 10.000002 }).freshness).toBe("changed-since");
  });

  it("V2 a mode charted again with the same values is no change", () => {
    expect(plateauAfter(volumeControl, volumeControl).freshness).toBe("current");
    expect(plateauAfter(volumeControl, pressureControl).freshness).toBe("changed-since");
  });

  it("V2 a field's first value is no change, but an inspiratory time or flow first charted after a reading is one", () => {
    expect(plateauAfter(volumeControl, { flowPattern: "square" }).freshness).toBe("current");
    expect(plateauAfter(withoutFlow, { flowLPerMin: 60 }).freshness).toBe("changed-since");
    expect(plateauAfter(withoutTime, { inspiratoryTimeS: 0.9 }).freshness).toBe("changed-since");
  });

  it("V2 the first settings are no change", () => {
    const facts = {
      settings: [settings("09:00", volumeControl)],
      observations: [spo2("08:30", 94)],
    };
    expect(metric("spo2Percent", "09:10", { facts }).freshness).toBe("current");
  });

  it("V2 a value changed and changed back is a change", () => {
    expect(plateauAfter(volumeControl, { peepCmH2O: 12 }, { peepCmH2O: 10 }).freshness).toBe("changed-since");
  });

  it("V2 no position charted counts as supine, no therapy as off", () => {
    const mechanics = [relaxed("10:00", 24)];
    const positions = [fact("10:10", { position: "supine" as const })];
    const therapies = [fact("10:10", { therapy: "ecmo" as const, on: false })];
    expect(metric("plateauCmH2O", "11:00", { facts: { mechanics, positions, therapies } }).freshness).toBe("current");
    const turned = [fact("10:10", { position: "right-lateral" as const })];
    expect(metric("plateauCmH2O", "11:00", { facts: { mechanics, positions: turned } })).toMatchObject({
      freshness: "changed-since",
      changedBy: "turn",
    });
  });

  it("V3 a reading in the same entry as a change, or at its moment, counts as taken after it", () => {
    const changed = { settings: [settings("08:00", volumeControl), settings("10:00", { peepCmH2O: 12 })] };
    const same = metric("drivingPressureCmH2O", "10:05", { facts: { ...changed, mechanics: [relaxed("10:00", 27)] } });
    expect(same).toMatchObject({ freshness: "current", value: 15 });
    const before = metric("drivingPressureCmH2O", "10:05", {
      facts: { ...changed, mechanics: [relaxed("09:59", 27)] },
    });
    expect(before).toMatchObject({ freshness: "changed-since", value: null, lastValue: 17 });
  });

  it("V3 takes the newest per field, not per row", () => {
    const mechanics = [
      relaxed("09:00", 25, { respiratoryRateTotal: 22 }),
      fact("10:00", { peakCmH2O: 33 }),
      fact("10:10", { respiratoryRateTotal: 26 }),
    ];
    expect(metric("plateauCmH2O", "10:20", { facts: { mechanics } })).toMatchObject({
      value: 25,
      chartedAt: moment("09:00"),
    });
    expect(metric("respiratoryRateTotal", "10:20", { facts: { mechanics } }).value).toBe(26);
    expect(metric("dynamicComplianceMlPerCmH2O", "10:20", { facts: { mechanics } }).chartedAt).toBe(moment("10:00"));
  });

  it("F9 words name the first change and what kind it was", () => {
    const facts = {
      settings: [
        settings("08:00", volumeControl),
        settings("10:20", { peepCmH2O: 12 }),
        settings("10:40", { tidalVolumeMl: 400 }),
      ],
      mechanics: [relaxed("10:00", 24)],
    };
    expect(metric("plateauCmH2O", "11:00", { facts })).toMatchObject({
      changedAt: moment("10:20"),
      changedBy: "settings",
      changedByEntryId: facts.settings[1]!.id,
      lastValue: 24,
      lastState: "inside",
    });
  });
});
