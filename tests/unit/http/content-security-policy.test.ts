import { describe, expect, it } from "vitest";
import { contentSecurityPolicy } from "@/lib/http/content-security-policy";

describe("a page's policy", () => {
  const policy = contentSecurityPolicy({ nonce: "abc", development: false });

  it("runs and styles by the request's nonce only", () => {
    expect(policy).toContain("script-src 'self' 'nonce-abc' 'strict-dynamic'");
    expect(policy).toContain("style-src 'self' 'nonce-abc'");
    expect(policy).not.toContain("unsafe");
  });

  it("talks to no other host and is framed by none", () => {
    expect(policy).toContain("default-src 'self'");
    expect(policy).toContain("connect-src 'self'");
    expect(policy).toContain("frame-ancestors 'none'");
    expect(policy).not.toMatch(/https?:|\*/);
  });
});
