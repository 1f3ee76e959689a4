import { describe, expect, it } from "vitest";
import { policyOf, startingSets, targetsFromSet, unitPolicyDefaults, type StartingSetName } from "@/lib/protocol";

/** The table of starting sets, written out anew: starting values from general practice, from memory. */
const table: [StartingSetName, object][] = [
  ["unit-default", { vtMlPerKg: [4, 8], plateau: 30, driving: 15, spo2: [92, 96], pao2: [60, 100], ph: [7.3, 7.45] }],
  ["ards", { vtMlPerKg: [4, 6.5], plateau: 30, driving: 15, spo2: [88, 95], pao2: [55, 80], ph: [7.3, 7.45] }],
  ["asthma", { vtMlPerKg: [6, 8], plateau: 30, driving: null, spo2: [93, 96], pao2: [60, 100], ph: [7.2, undefined] }],
  ["copd", { vtMlPerKg: [6, 8], plateau: 30, driving: null, spo2: [88, 92], pao2: [55, 80], ph: [7.2, undefined] }],
  [
    "raised-icp",
    { vtMlPerKg: [6, 8], plateau: 30, driving: 15, spo2: [94, undefined], pao2: [80, 120], ph: [7.35, 7.45] },
  ],
  [
    "after-cardiac-arrest",
    { vtMlPerKg: [6, 8], plateau: 30, driving: 15, spo2: [94, 98], pao2: [75, 100], ph: [7.3, 7.45] },
  ],
  [
    "pregnancy",
    { vtMlPerKg: [4, 8], plateau: 30, driving: 15, spo2: [95, undefined], pao2: [70, undefined], ph: [7.35, 7.47] },
  ],
  ["ecmo", { vtMlPerKg: [undefined, 4], plateau: 25, driving: 14, spo2: [85, 95], pao2: [55, 80], ph: [7.3, 7.45] }],
  ["one-lung", { vtMlPerKg: null, plateau: 30, driving: 15, spo2: null, pao2: null, ph: null }],
];

const pair = (range: { min?: number; max?: number } | null | undefined) => range && [range.min, range.max];

describe("starting sets", () => {
  it.each(table)("O1 %s holds its numbers", (name, expected) => {
    const targets = targetsFromSet(name);
    expect({
      vtMlPerKg: pair(targets.vtMlPerKg),
      plateau: targets.plateauCmH2O?.max,
      driving: targets.drivingPressureCmH2O?.max ?? null,
      spo2: pair(targets.spo2Percent),
      pao2: pair(targets.pao2MmHg),
      ph: pair(targets.ph),
    }).toEqual(expected);
  });

  it("O2 a set fills the conditions: asthma obstructive, COPD both", () => {
    expect(startingSets.asthma.targets.conditions).toEqual(["obstructive"]);
    expect(startingSets.copd.targets.conditions).toEqual(["obstructive", "copd"]);
    expect(startingSets["unit-default"].targets.conditions).toEqual([]);
  });

  it("O1 PaCO2 is ordered where the table orders it, and rates where it limits them", () => {
    const ordered = Object.entries(startingSets).filter(([, { targets }]) => targets.paco2MmHg !== null);
    expect(ordered.map(([name, { targets }]) => [name, targets.paco2MmHg])).toEqual([
      ["raised-icp", { min: 35, max: 45 }],
      ["after-cardiac-arrest", { min: 35, max: 45 }],
      ["pregnancy", { min: 28, max: 35 }],
    ]);
    expect(pair(startingSets.asthma.targets.respiratoryRate)).toEqual([6, 14]);
    expect(pair(startingSets.copd.targets.respiratoryRate)).toEqual([8, 14]);
    expect(pair(startingSets.ecmo.targets.respiratoryRate)).toEqual([5, 20]);
    expect(pair(startingSets.ards.targets.respiratoryRate)).toEqual([undefined, 35]);
  });

  it("O1 a set is the default until somebody orders it", () => {
    expect(targetsFromSet("ards")).toMatchObject({ set: "ards", origin: "default" });
    expect(targetsFromSet("ards", "order").origin).toBe("order");
  });
});

describe("unit policy", () => {
  it("fills what a unit leaves out, and keeps what it sets", () => {
    const policy = policyOf({ barometricPressureMmHg: 630, intervals: { gasMin: 360 } });
    expect(policy.barometricPressureMmHg).toBe(630);
    expect(policy.intervals).toEqual({ ...unitPolicyDefaults.intervals, gasMin: 360 });
    expect(policyOf(null)).toBe(unitPolicyDefaults);
  });
});
