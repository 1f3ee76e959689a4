import { describe, expect, it } from "vitest";
import { bodyHash } from "@/lib/http/body-hash";

const path = "/api/patients/7/settings";

describe("what makes two requests the same", () => {
  it("is not the order of names, at any depth", () => {
    const one = bodyHash("POST", path, { a: 1, b: { c: [1, { d: 2, e: 3 }], f: null } });
    expect(bodyHash("POST", path, { b: { f: null, c: [1, { e: 3, d: 2 }] }, a: 1 })).toBe(one);
  });

  it("is method, path with its ids, and every value with its type and place", () => {
    const hashes = [
      bodyHash("POST", path, { a: [1, 2] }),
      bodyHash("PATCH", path, { a: [1, 2] }),
      bodyHash("POST", "/api/patients/8/settings", { a: [1, 2] }),
      bodyHash("POST", path, { a: [2, 1] }),
      bodyHash("POST", path, { a: ["1", 2] }),
      bodyHash("POST", path, { a: [1, 2], b: null }),
      bodyHash("POST", path, { a: { 0: 1, 1: 2 } }),
    ];
    expect(new Set(hashes).size).toBe(hashes.length);
  });

  it("is a SHA-256 in lower-case hexadecimal, as its column asks", () => {
    expect(bodyHash("POST", path, {})).toMatch(/^[0-9a-f]{64}$/);
  });
});
