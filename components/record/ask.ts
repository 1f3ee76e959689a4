import type { Targets } from "@/lib/protocol/targets";

/** Something unusual that one more tap lets through. */
export interface Ask {
  /** Names field and value, so that a value changed later is asked anew. */
  key: string;
  question: string;
  yes: string;
  /** Answered 'no' charts something else than 'yes' does. */
  no?: string;
}

export interface AskContext {
  targets: Targets;
  pbwKg: number | null;
}
