import { describe, expect, test } from "vitest";
import { globalDefinitionSeverity, type GlobalDefinitionInput } from "@/lib/physiology";

const answer = (category: string, severity: string, missing: string[] = []) => ({ category, severity, missing });

// Matthay, Am J Respir Crit Care Med 2024;209:37.
describe("global definition", () => {
  test.each([
    [100, "severe"],
    [100.1, "moderate"],
    [200, "moderate"],
    [200.1, "mild"],
    [300, "mild"],
  ])("intubated with a P/F of %d is %s", (pfRatio, severity) => {
    expect(globalDefinitionSeverity({ support: "invasive", pfRatio })).toEqual(answer("intubated", severity));
  });

  test.each([
    [148, "severe"],
    [148.1, "moderate"],
    [235, "moderate"],
    [235.1, "mild"],
    [315, "mild"],
  ])("intubated with an S/F of %d at SpO2 97 is %s", (sfRatio, severity) => {
    const input = { support: "invasive", sfRatio, spo2Percent: 97 } as const;
    expect(globalDefinitionSeverity(input)).toEqual(answer("intubated", severity));
  });

  test.each<[string, GlobalDefinitionInput, ReturnType<typeof answer>]>([
    ["a P/F above 300 is not met", { support: "invasive", pfRatio: 300.1 }, answer("not met", "none")],
    ["an S/F above 315 is not met", { support: "invasive", sfRatio: 316, spo2Percent: 95 }, answer("not met", "none")],
    [
      "an S/F above SpO2 97 is not usable",
      { support: "invasive", sfRatio: 200, spo2Percent: 97.1 },
      answer("not classifiable", "not usable"),
    ],
    [
      "a P/F goes before an S/F that is not usable",
      { support: "invasive", pfRatio: 90, sfRatio: 200, spo2Percent: 99 },
      answer("intubated", "severe"),
    ],
    [
      "an S/F without its SpO2 says nothing",
      { support: "invasive", sfRatio: 200 },
      answer("not classifiable", "not graded", ["spo2Percent"]),
    ],
    [
      "without any ratio both ways are named",
      { support: "invasive" },
      answer("not classifiable", "not graded", ["pfRatio", "sfRatio", "spo2Percent"]),
    ],
    [
      "HFNO at 30 L/min counts",
      { support: "hfno", flowLPerMin: 30, pfRatio: 90 },
      answer("non-intubated", "not graded"),
    ],
    [
      "HFNO under 30 L/min does not",
      { support: "hfno", flowLPerMin: 29.9, pfRatio: 90 },
      answer("not met", "not graded"),
    ],
    [
      "HFNO without a flow cannot be told",
      { support: "hfno", pfRatio: 90 },
      answer("not classifiable", "not graded", ["flowLPerMin"]),
    ],
    ["HFNO above 300 is not met, flow or not", { support: "hfno", pfRatio: 320 }, answer("not met", "none")],
    ["NIV at PEEP 5 counts", { support: "niv-cpap", peepCmH2O: 5, pfRatio: 90 }, answer("non-intubated", "not graded")],
    ["NIV under PEEP 5 does not", { support: "niv-cpap", peepCmH2O: 4, pfRatio: 90 }, answer("not met", "not graded")],
    [
      "NIV without a PEEP cannot be told",
      { support: "niv-cpap", pfRatio: 90 },
      answer("not classifiable", "not graded", ["peepCmH2O"]),
    ],
    [
      "NIV with neither names both",
      { support: "niv-cpap", spo2Percent: 90 },
      answer("not classifiable", "not graded", ["peepCmH2O", "pfRatio", "sfRatio"]),
    ],
    [
      "low-flow oxygen counts by S/F alone",
      { support: "low-flow", sfRatio: 315, spo2Percent: 90 },
      answer("resource-limited", "not graded"),
    ],
    [
      "low-flow oxygen is never judged by P/F",
      { support: "low-flow", pfRatio: 90 },
      answer("not classifiable", "not graded", ["sfRatio", "spo2Percent"]),
    ],
  ])("%s", (_fact, input, expected) => {
    expect(globalDefinitionSeverity(input)).toEqual(expected);
  });

  test.each<[unknown, RegExp]>([
    [{ support: "invasive", pfRatio: NaN }, /^pfRatio must be a number/],
    [{ support: "invasive", sfRatio: 29, spo2Percent: 90 }, /^sfRatio 29 is outside the allowed 30 to 477$/],
    [{ support: "invasive", sfRatio: 200, spo2Percent: 0.9 }, /^spo2Percent 0\.9 .* it looks like a fraction$/],
    [{ support: "niv-cpap", pfRatio: 90, peepCmH2O: 51 }, /^peepCmH2O 51 is outside/],
    [{ support: "hfno", pfRatio: 90, flowLPerMin: 81 }, /^flowLPerMin 81 is outside the allowed 1 to 80$/],
    [{ support: "mask", pfRatio: 90 }, /^support "mask" is not known: allowed invasive, niv-cpap, hfno, low-flow$/],
    [{ support: "toString", pfRatio: 90 }, /^support "toString" is not known/],
  ])("refuses %o", (input, message) => {
    const calling = () => globalDefinitionSeverity(input as GlobalDefinitionInput);
    expect(calling).toThrow(RangeError);
    expect(calling).toThrow(message);
  });
});
