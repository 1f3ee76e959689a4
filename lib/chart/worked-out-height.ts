import { AppError, lengthOfMethod, type HeightBody } from "@/lib/contracts";
import { roundHalfUp } from "@/lib/format";
import { heightFromDemispanCm, heightFromKneeHeightCm, heightFromUlnaCm } from "@/lib/physiology";

export type MeasuredLength = Pick<
  HeightBody,
  "method" | "sexForPbw" | "heightCm" | "ulnaCm" | "demispanCm" | "kneeHeightCm"
>;

/** The record keeps at most this many decimals of a length. */
const DECIMALS = 4;

function estimatedCm({ method, sexForPbw: sex, ...lengths }: MeasuredLength, ageYears: number): number | undefined {
  const { ulnaCm = NaN, demispanCm = NaN, kneeHeightCm = NaN } = lengths;
  if (method === "ulna") return heightFromUlnaCm({ sex, ageYears, ulnaCm });
  if (method === "demispan") return heightFromDemispanCm({ sex, ageYears, demispanCm });
  if (method === "knee-height") return heightFromKneeHeightCm({ sex, ageYears, kneeHeightCm });
  return lengths.heightCm;
}

function refusal(method: MeasuredLength["method"], prefix: string, cause: unknown): AppError {
  const field = method in lengthOfMethod ? lengthOfMethod[method as keyof typeof lengthOfMethod] : "heightCm";
  const path = prefix ? `${prefix}.${field}` : field;
  const message =
    method === "knee-height"
      ? "Knee height gives a height at 60 to 90 years only: measure another way."
      : "This length gives no height at this age: measure another way.";
  return new AppError("validation-failed", message, { errors: [{ path, message }], cause });
}

/** The height (cm) as measured, or worked out from the ulna, knee height or demispan at the person's age; `prefix` is where it stands in the body. */
export function workedOutHeightCm(length: MeasuredLength, ageYears: number, prefix = ""): number {
  try {
    return roundHalfUp(estimatedCm(length, ageYears) ?? NaN, DECIMALS);
  } catch (cause) {
    if (cause instanceof RangeError) throw refusal(length.method, prefix, cause);
    throw cause;
  }
}
