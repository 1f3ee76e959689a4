import { describe, expect, it } from "vitest";
import { clockTime } from "@/lib/format";

const london = (at: string, now: string) => clockTime({ at, now, timeZone: "Europe/London" });

describe("clockTime", () => {
  it("is the time alone under 24 h, across midnight too", () => {
    expect(london("2026-12-01T22:40:00Z", "2026-12-02T02:00:00Z")).toBe("22:40");
    expect(london("2026-12-01T10:20:00Z", "2026-12-02T10:19:59Z")).toBe("10:20");
  });

  it("carries its day from 24 h on, before and after now", () => {
    expect(london("2026-12-01T10:20:00Z", "2026-12-02T10:20:00Z")).toBe("Tue 1 Dec 10:20");
    expect(london("2026-12-03T11:00:00Z", "2026-12-02T10:20:00Z")).toBe("Thu 3 Dec 11:00");
  });
});
