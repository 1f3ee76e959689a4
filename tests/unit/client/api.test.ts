import { afterEach, describe, expect, it, vi } from "vitest";
import { z } from "zod";
import { AppError } from "@/lib/contracts";
import { request } from "@/lib/client/api";
import { NetworkError } from "@/lib/client/network-error";
import { onSessionLoss } from "@/lib/client/session-loss";
import { UnreadableAnswerError } from "@/lib/client/unreadable-answer-error";

const answer = z.object({ saved: z.boolean() });
const asked = { path: "/api/things", answer };
const json = (status: number, body: unknown) => new Response(JSON.stringify(body), { status });
const problem = {
  type: "/problems/conflict",
  title: "",
  status: 409,
  detail: "Changed meanwhile.",
  errors: [],
  conflict: [],
};

function network(respond: () => Response) {
  const fetched = vi.fn<typeof fetch>(async () => respond());
  vi.stubGlobal("fetch", fetched);
  return fetched;
}

afterEach(() => vi.unstubAllGlobals());

describe("a request", () => {
  it("reads a good answer by its contract", async () => {
    network(() => json(200, { saved: true }));
    await expect(request(asked)).resolves.toEqual({ saved: true });
  });

  it("sends a body as JSON, and is a POST for it", async () => {
    const fetched = network(() => json(201, { saved: true }));
    await request({ ...asked, body: { peepCmH2O: 12 } });
    expect(fetched).toHaveBeenCalledWith("/api/things", {
      method: "POST",
      cache: "no-store",
      body: '{"peepCmH2O":12}',
      headers: { "Content-Type": "application/json" },
    });
  });

  it("turns the server's problem into the error it was there", async () => {
    network(() => json(409, problem));
    const error: unknown = await request(asked).catch((thrown: unknown) => thrown);
    expect(error).toBeInstanceOf(AppError);
    expect(error).toMatchObject({ kind: "conflict", message: "Changed meanwhile.", conflict: [] });
  });

  it("tells a lost network from a refusal", async () => {
    network(() => {
      throw new TypeError("Failed to fetch");
    });
    await expect(request(asked)).rejects.toBeInstanceOf(NetworkError);
    network(() => new Response('{"saved":', { status: 200 }));
    await expect(request(asked)).rejects.toBeInstanceOf(NetworkError);
  });

  it("says that an answer outside the contract cannot be read", async () => {
    network(() => json(200, { saved: "maybe" }));
    await expect(request(asked)).rejects.toBeInstanceOf(UnreadableAnswerError);
  });

  it("keeps the status of a failure that says nothing", async () => {
    network(() => new Response("Bad gateway", { status: 502 }));
    await expect(request(asked)).rejects.toMatchObject({ kind: "internal" });
  });

  it("tells whoever listens that the session was lost", async () => {
    const heard = vi.fn();
    const stop = onSessionLoss(heard);
    network(() => json(401, { ...problem, type: "/problems/locked", status: 401 }));
    await expect(request(asked)).rejects.toMatchObject({ kind: "locked" });
    stop();
    await expect(request(asked)).rejects.toMatchObject({ kind: "locked" });
    expect(heard.mock.calls).toEqual([["locked"]]);
  });
});
