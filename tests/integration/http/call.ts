import type { Worksheet } from "@/lib/contracts";

type Handler = (request: Request, context: { params: Promise<Record<string, string>> }) => Promise<Response>;

export interface Sent {
  method?: "GET" | "POST" | "PATCH";
  path?: string;
  /** The `Cookie` of `signedInAs`; nobody is signed in without it. */
  cookie?: string;
  params?: Record<string, string>;
  /** Sent as JSON; a string is sent as it is. */
  body?: unknown;
  /** Replaces what our own page would send; null leaves a header out. */
  headers?: Record<string, string | null>;
}

const host = "127.0.0.1:3000";

function headersOf({ cookie, headers = {} }: Sent): Headers {
  const usual: Record<string, string | null> = {
    host,
    origin: `http://${host}`,
    "content-type": "application/json",
    cookie: cookie ?? null,
    ...headers,
  };
  return new Headers(Object.entries(usual).filter((pair): pair is [string, string] => pair[1] !== null));
}

export interface Answered {
  status: number;
  headers: Headers;
  // What a test looks into; each names what it expects.
  json: Record<string, unknown> & { errors?: { path: string; message: string }[]; worksheet?: Worksheet };
}

/** Calls a route's handler as our own page would, and reads its JSON. */
export async function call(handler: Handler, sent: Sent = {}): Promise<Answered> {
  const method = sent.method ?? (sent.body === undefined ? "GET" : "POST");
  const body = typeof sent.body === "string" ? sent.body : JSON.stringify(sent.body);
  const request = new Request(`http://${host}${sent.path ?? "/api/test"}`, {
    method,
    headers: headersOf(sent),
    ...(sent.body !== undefined && { body }),
  });
  const response = await handler(request, { params: Promise.resolve(sent.params ?? {}) });
  return { status: response.status, headers: response.headers, json: (await response.json()) as Answered["json"] };
}

export const paths = ({ json }: Answered): string[] => (json.errors ?? []).map(({ path }) => path);
