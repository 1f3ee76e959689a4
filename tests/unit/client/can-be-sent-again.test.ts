import { describe, expect, it } from "vitest";
import { AppError } from "@/lib/contracts";
import { canBeSentAgain, waitBeforeTry } from "@/lib/client/can-be-sent-again";
import { NetworkError } from "@/lib/client/network-error";
import { UnreadableAnswerError } from "@/lib/client/unreadable-answer-error";

describe("sending again", () => {
  it("is for what nobody has refused: a lost network, a failing server, too many tries", () => {
    expect(canBeSentAgain(new NetworkError(null))).toBe(true);
    expect(canBeSentAgain(new AppError("internal", ""))).toBe(true);
    expect(canBeSentAgain(new AppError("not-ready", ""))).toBe(true);
    expect(canBeSentAgain(new AppError("slow-down", ""))).toBe(true);
  });

  it("is not for what was refused, nor for what was done and answered unreadably", () => {
    for (const kind of ["forbidden", "conflict", "validation-failed", "locked", "not-found"] as const) {
      expect(canBeSentAgain(new AppError(kind, ""))).toBe(false);
    }
    expect(canBeSentAgain(new UnreadableAnswerError(null))).toBe(false);
  });

  it("waits 1, 2, 4 s and so on, 30 s at most", () => {
    expect([1, 2, 3, 5, 6, 40].map(waitBeforeTry)).toEqual([1000, 2000, 4000, 16_000, 30_000, 30_000]);
  });
});
