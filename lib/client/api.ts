import type { z } from "zod";
import { AppError, problemSchema } from "@/lib/contracts";
import { NetworkError } from "./network-error";
import { tellSessionLoss } from "./session-loss";
import { UnreadableAnswerError } from "./unreadable-answer-error";

interface Request<Schema extends z.ZodType> {
  path: string;
  answer: Schema;
  method?: "GET" | "POST" | "PATCH";
  /** Sent as JSON; its presence makes the request a POST unless `method` says otherwise. */
  body?: unknown;
  signal?: AbortSignal | undefined;
}

/**
 * Asks our own server and reads the answer by its contract.
 * @throws NetworkError where no answer came (it may still have arrived)
 * @throws AppError as the server's problem says
 * @throws UnreadableAnswerError where it answered well, but not by the contract
 */
export async function request<Schema extends z.ZodType>(asked: Request<Schema>): Promise<z.output<Schema>> {
  const response = await send(asked);
  const json = await readJson(response);
  if (!response.ok) {
    const error = errorOf(response, json);
    tellSessionLoss(error);
    throw error;
  }
  const answer = asked.answer.safeParse(json);
  if (!answer.success) throw new UnreadableAnswerError(answer.error);
  return answer.data;
}

async function send({ path, method, body, signal }: Request<z.ZodType>): Promise<Response> {
  const init: RequestInit = { method: method ?? (body === undefined ? "GET" : "POST"), cache: "no-store" };
  if (signal) init.signal = signal;
  if (body !== undefined) {
    init.body = JSON.stringify(body);
    init.headers = { "Content-Type": "application/json" };
  }
  try {
    return await fetch(path, init);
  } catch (cause) {
    if (signal?.aborted) throw cause;
    throw new NetworkError(cause);
  }
}

async function readJson(response: Response): Promise<unknown> {
  try {
    return await response.json();
  } catch (cause) {
    // A body cut off in the middle is a lost network, and so is a proxy's page in place of our JSON.
    if (response.ok) throw new NetworkError(cause);
    return null;
  }
}

function errorOf(response: Response, json: unknown): AppError {
  const problem = problemSchema.safeParse(json);
  const wait = response.headers.get("Retry-After");
  if (problem.success) return AppError.fromProblem(problem.data, wait === null ? {} : { "Retry-After": wait });
  const kind = response.status === 401 ? "not-signed-in" : response.status === 404 ? "not-found" : "internal";
  return new AppError(kind, `The server answered ${response.status} without saying why.`);
}
