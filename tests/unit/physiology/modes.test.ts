import { describe, expect, test } from "vitest";
import { fieldsOfMode, modeLabel, modeSettings, settingFields, ventilationModes } from "@/lib/physiology";

describe("modes", () => {
  test("a mode is labelled as ISO 19223 writes it", () => {
    expect(modeLabel("SIMV-VC-PS")).toBe("SIMV-VC\\PS");
    expect(modeLabel("SIMV-PC-PS")).toBe("SIMV-PC\\PS");
    expect(modeLabel("A/C-VC")).toBe("A/C-VC");
    expect(modeLabel("CSV-PS")).toBe("CSV-PS");
  });

  test.each(ventilationModes)("%s uses only known settings, and every required one", (mode) => {
    const used = fieldsOfMode(mode);
    const { required, oneOf } = modeSettings(mode);
    expect([...used].filter((field) => !settingFields.includes(field))).toEqual([]);
    expect([...required, ...oneOf].filter((field) => !used.has(field))).toEqual([]);
    expect(used.has("fio2")).toBe(true);
  });

  test("volume is set in volume modes, pressure above PEEP in pressure modes, never both", () => {
    for (const mode of ventilationModes) {
      const used = fieldsOfMode(mode);
      expect(used.has("tidalVolumeMl") && used.has("pressureAbovePeepCmH2O")).toBe(false);
    }
    expect(fieldsOfMode("A/C-VC").has("tidalVolumeMl")).toBe(true);
    expect(fieldsOfMode("A/C-PC").has("pressureAbovePeepCmH2O")).toBe(true);
  });
});
