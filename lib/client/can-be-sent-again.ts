import { AppError } from "@/lib/contracts";
import { NetworkError } from "./network-error";

/** Whether the same body under the same key may simply be sent again: nobody has refused it. */
export function canBeSentAgain(error: unknown): boolean {
  if (error instanceof NetworkError) return true;
  return error instanceof AppError && (error.status >= 500 || error.kind === "slow-down");
}

const longestWaitMs = 30_000;

/** 1, 2, 4 … 30 s. @param failures how many tries have failed, from 1 */
export function waitBeforeTry(failures: number): number {
  return Math.min(longestWaitMs, 1000 * 2 ** Math.max(0, failures - 1));
}
