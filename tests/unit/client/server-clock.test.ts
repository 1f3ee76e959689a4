import { describe, expect, it } from "vitest";
import { deviceClockOffMinutes, observeServerTime, serverNow } from "@/lib/client/server-clock";

const at = "2026-12-01T14:20:00Z";

describe("the server's clock", () => {
  it("is what ages are counted by, however wrong this device's is", () => {
    observeServerTime(at, Date.now());
    expect(Math.abs(serverNow() - Date.parse(at))).toBeLessThan(1000);
  });

  it("tells a device clock that is more than 2 min off, with its direction", () => {
    const server = Date.parse(at);
    observeServerTime(at, server - 5 * 60_000);
    expect(deviceClockOffMinutes()).toBe(-5);
    observeServerTime(at, server + 3 * 60_000);
    expect(deviceClockOffMinutes()).toBe(3);
    observeServerTime(at, server + 2 * 60_000);
    expect(deviceClockOffMinutes()).toBe(0);
  });
});
