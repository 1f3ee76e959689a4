import { vi } from "vitest";
import type { Worksheet } from "@/lib/contracts";

export interface Sent {
  path: string;
  body: Record<string, unknown>;
}

type Answer = (sent: Sent) => Response | Promise<Response>;

const json = (status: number, body: unknown) => new Response(JSON.stringify(body), { status });

export const problem = (status: number, kind: string, more: object = {}) =>
  json(status, { type: `/problems/${kind}`, title: kind, status, detail: "Refused.", errors: [], ...more });

/** What the server answers to a save: filed under one submission, with the worksheet it leaves. */
export const charted = (worksheet: Worksheet, kinds: string[] = ["settings"]) =>
  json(201, {
    submission: { id: "500" },
    entries: kinds.map((kind, index) => ({ id: String(600 + index), kind })),
    worksheet,
  });

/** The network's edge: reads answer with the worksheet, writes as told, one answer after another, the last one for ever. */
export function stubNetwork(worksheet: Worksheet, ...answers: Answer[]) {
  const sent: Sent[] = [];
  const respond = async (path: string, init?: RequestInit): Promise<Response> => {
    if ((init?.method ?? "GET") === "GET") return json(200, worksheet);
    const posted = { path, body: JSON.parse(String(init?.body)) as Record<string, unknown> };
    sent.push(posted);
    const answer = answers[Math.min(sent.length, answers.length) - 1];
    if (!answer) throw new TypeError("Failed to fetch");
    return answer(posted);
  };
  vi.stubGlobal("fetch", (path: string, init?: RequestInit) => respond(path, init));
  return sent;
}

/** No answer: the network is gone. */
export const lost: Answer = () => {
  throw new TypeError("Failed to fetch");
};
