import { describe, expect, it } from "vitest";
import { requireSystem } from "@/lib/launch/requirements.mjs";
import { modeFrom, portFrom, readSettings, root } from "@/lib/launch/settings.mjs";

describe("what the environment asks of the launcher", () => {
  it("an empty environment is the demo on port 3000 with its data in the checkout", () => {
    expect(readSettings({})).toEqual({ mode: "demo", port: 3000, pgPort: undefined, data: `${root}/.data` });
  });

  it("PORT, NEAPTIDE_PG_PORT and NEAPTIDE_DATA move it", () => {
    const asked = readSettings({ PORT: "4000", NEAPTIDE_PG_PORT: "5500", NEAPTIDE_DATA: "/srv/tide" });
    expect(asked).toEqual({ mode: "demo", port: 4000, pgPort: 5500, data: "/srv/tide" });
  });

  it.each(["0", "65536", "-1", "3000a", "3e3", "http"])("PORT=%s is refused by name", (text) => {
    expect(() => portFrom("PORT", text)).toThrow(/^PORT must be a whole number from 1 to 65535/);
  });

  it.each(["DATABASE_URL", "MIGRATION_DATABASE_URL"])("%s without production mode is refused", (name) => {
    expect(() => modeFrom({ [name]: "postgres://db.example.org/neaptide" })).toThrow(name);
  });

  it("DATABASE_URL is welcome in production mode", () => {
    expect(modeFrom({ NEAPTIDE_MODE: "production", DATABASE_URL: "postgres://db.example.org/neaptide" })).toBe(
      "production",
    );
  });

  it("a mode that does not exist is refused, so that a typing error never starts the demo", () => {
    expect(() => modeFrom({ NEAPTIDE_MODE: "prodution" })).toThrow(/'prodution'/);
  });
});

describe("the system", () => {
  it("Node 20.9 on Linux is enough; older Node and other systems are refused in a sentence", () => {
    expect(() => requireSystem("20.9.0", "linux")).not.toThrow();
    expect(() => requireSystem("20.8.1", "linux")).toThrow("Node 20.9 or newer is needed; this is 20.8.1.");
    expect(() => requireSystem("18.20.0", "linux")).toThrow("Node 20.9");
    expect(() => requireSystem("22.1.0", "darwin")).toThrow("darwin");
  });
});
