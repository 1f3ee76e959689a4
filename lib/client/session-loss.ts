import { AppError } from "@/lib/contracts";

export type SessionLoss = "locked" | "not-signed-in";

type Listener = (loss: SessionLoss) => void;

const listeners = new Set<Listener>();

/** Hear when any request is answered 401: the lock screen covers the page, and what was typed stays under it. */
export function onSessionLoss(listener: Listener): () => void {
  listeners.add(listener);
  return () => listeners.delete(listener);
}

export function tellSessionLoss(error: unknown): void {
  if (!(error instanceof AppError)) return;
  const { kind } = error;
  if (kind === "locked" || kind === "not-signed-in") listeners.forEach((listener) => listener(kind));
}
