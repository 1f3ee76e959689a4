import { afterEach, describe, expect, it, vi } from "vitest";
import { clientKeySchema } from "@/lib/contracts";
import { newClientKey } from "@/lib/client/new-client-key";

afterEach(() => vi.unstubAllGlobals());

describe("a key made on the device", () => {
  it("is a UUID, another one each time", () => {
    const keys = [newClientKey(), newClientKey()];
    expect(new Set(keys).size).toBe(2);
    expect(keys.every((key) => clientKeySchema.safeParse(key).success)).toBe(true);
  });

  it("is made too where the page is no secure context", () => {
    const getRandomValues = crypto.getRandomValues.bind(crypto);
    vi.stubGlobal("crypto", { getRandomValues });
    expect(clientKeySchema.safeParse(newClientKey()).success).toBe(true);
  });
});
