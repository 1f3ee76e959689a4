import { randomUUID } from "node:crypto";
import { AppError } from "@/lib/contracts";
import { errorFacts } from "./error-facts";
import { log } from "./log";

export interface Answer {
  status: number;
  body: unknown;
  headers?: Record<string, string>;
}

function problemOf(error: unknown, request: Request, requestId: string): AppError {
  if (error instanceof AppError) return error;
  const path = new URL(request.url).pathname;
  log.error({ requestId, method: request.method, path, error: errorFacts(error) }, "request failed");
  return new AppError("internal", `Nothing was saved. Try again; if it stays, report request ${requestId}.`);
}

function answerOf(error: AppError): Answer {
  return {
    status: error.status,
    body: error.toProblem(),
    headers: { ...error.headers, "Content-Type": "application/problem+json" },
  };
}

/** Runs a handler and turns what it answers or throws into a response; the only place that knows HTTP's headers. */
export async function respond(request: Request, handle: (requestId: string) => Promise<Answer>): Promise<Response> {
  const requestId = randomUUID();
  const { status, body, headers } = await handle(requestId).catch((error: unknown) =>
    answerOf(problemOf(error, request, requestId)),
  );
  return Response.json(body, {
    status,
    headers: {
      "Cache-Control": "no-store",
      "X-Content-Type-Options": "nosniff",
      "X-Request-Id": requestId,
      ...headers,
    },
  });
}
