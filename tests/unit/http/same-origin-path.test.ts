import { describe, expect, it } from "vitest";
import { sameOriginPath } from "@/lib/http/same-origin-path";

describe("where to go after signing in", () => {
  it.each(["/", "/beds?unit=2", "/patients/7?at=2026-12-01T12:00:00Z#plateau"])("is %s when it is ours", (path) => {
    expect(sameOriginPath(path, "/beds")).toBe(path);
  });

  it.each([
    "//elsewhere.example",
    "/\\elsewhere.example",
    "\\\\elsewhere.example",
    "https://elsewhere.example/beds",
    "javascript:alert(1)",
    "beds",
    "",
    "/\t/elsewhere.example",
    "/\n/elsewhere.example",
    "/beds\\..\\x",
    null,
    undefined,
  ])("is the fallback for %j", (asked) => {
    expect(sameOriginPath(asked, "/beds")).toBe("/beds");
  });

  it("cannot climb out of its host", () => {
    expect(sameOriginPath("/../..//elsewhere.example", "/beds")).not.toMatch(/^\/\//);
  });
});
