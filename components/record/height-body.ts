import {
  heightMethods,
  lengthOfMethod,
  refusalOf,
  unitOf,
  wordsOf,
  type HeightBody,
  type HeightMethod,
} from "@/lib/contracts";
import { cmFromFeetInches, roundHalfUp } from "@/lib/format";
import {
  heightFromDemispanCm,
  heightFromKneeHeightCm,
  heightFromUlnaCm,
  isUnusual,
  pbwHeightCm,
  predictedBodyWeightKg,
  type ChartedField,
} from "@/lib/physiology";
import { typedNumber } from "./typed-number";

/** The small height form as typed. */
export interface HeightValues {
  method: HeightMethod | null;
  sex: "male" | "female" | null;
  inFeet: boolean;
  length: string;
  feet: string;
  inches: string;
  reason: string;
  confirmed: boolean;
}

export const emptyHeight: HeightValues = {
  method: null,
  sex: null,
  inFeet: false,
  length: "",
  feet: "",
  inches: "",
  reason: "",
  confirmed: false,
};

type LengthField = "heightCm" | "ulnaCm" | "kneeHeightCm" | "demispanCm";

export function lengthFieldOf(method: HeightMethod): LengthField {
  return (lengthOfMethod as Partial<Record<HeightMethod, LengthField>>)[method] ?? "heightCm";
}

export interface HeightCheck {
  /** Why the length is refused. */
  refusal: string | null;
  /** The length as charted, cm. */
  lengthCm: number | null;
  heightCm: number | null;
  pbwKg: number | null;
  /** The length is unusual: confirmed with one more tap. */
  asks: string | null;
  asksReason: boolean;
  blocker: string | null;
}

const whole = /^\d{1,2}$/;

function typedLength(values: HeightValues, field: LengthField): { value: number } | { refusal: string } | null {
  if (field !== "heightCm" || !values.inFeet) return typedNumber(field, values.length);
  if (values.feet.trim() === "" || values.inches.trim() === "") return null;
  const inches = Number(values.inches.replace(",", "."));
  if (!whole.test(values.feet.trim()) || !(inches >= 0 && inches < 12)) {
    return { refusal: "Enter whole feet, and inches from 0 to under 12." };
  }
  const value = roundHalfUp(cmFromFeetInches({ feet: Number(values.feet), inches }), 1);
  const refusal = refusalOf(field, value);
  return refusal ? { refusal } : { value };
}

/** The height a length stands for; null where its equation does not hold (knee height outside 60 to 90 years). */
function heightOf(method: HeightMethod, sex: "male" | "female", ageYears: number, lengthCm: number): number | null {
  try {
    if (method === "ulna") return heightFromUlnaCm({ sex, ageYears, ulnaCm: lengthCm });
    if (method === "knee-height") return heightFromKneeHeightCm({ sex, ageYears, kneeHeightCm: lengthCm });
    if (method === "demispan") return heightFromDemispanCm({ sex, ageYears, demispanCm: lengthCm });
    return lengthCm;
  } catch (refusal) {
    if (refusal instanceof RangeError) return null;
    throw refusal;
  }
}

function pbwOf(heightCm: number | null, sex: "male" | "female" | null): number | null {
  if (heightCm === null || sex === null || heightCm < pbwHeightCm.min || heightCm > pbwHeightCm.max) return null;
  return predictedBodyWeightKg({ sex, heightCm });
}

/** A lower method replaces a higher one only with a reason. */
function isLower(method: HeightMethod, standing: HeightMethod | null): boolean {
  return standing !== null && heightMethods.indexOf(method) > heightMethods.indexOf(standing);
}

const written = (field: ChartedField, value: number) => `${wordsOf(field)} ${value} ${unitOf(field)}`;

/** What the height form says of itself while it is filled in. */
export function checkHeight(
  values: HeightValues,
  { ageYears, standing }: { ageYears: number; standing: HeightMethod | null },
): HeightCheck {
  const { method, sex } = values;
  const field = method ? lengthFieldOf(method) : null;
  const typed = field ? typedLength(values, field) : null;
  const lengthCm = typed && "value" in typed ? typed.value : null;
  const heightCm = method && sex && lengthCm !== null ? heightOf(method, sex, ageYears, lengthCm) : null;
  const estimateFails = method !== null && sex !== null && lengthCm !== null && heightCm === null;
  const refusal =
    typed && "refusal" in typed
      ? typed.refusal
      : estimateFails
        ? `This estimate does not hold at ${ageYears} years: use another method.`
        : null;
  const asks =
    field && lengthCm !== null && isUnusual(field, lengthCm) ? `${written(field, lengthCm)} is unusual.` : null;
  const asksReason = method !== null && isLower(method, standing);
  const blockers = [
    method ? null : "Choose how the height was got.",
    refusal,
    lengthCm === null ? "Enter the length." : null,
    sex ? null : "Say which sex is used for PBW.",
    asks && !values.confirmed ? "Answer what is asked." : null,
    asksReason && values.reason.trim() === "" ? "Say why a lower method replaces the one before." : null,
  ];
  return {
    refusal,
    lengthCm,
    heightCm,
    pbwKg: pbwOf(heightCm, sex),
    asks,
    asksReason,
    blocker: blockers.find((blocker) => blocker !== null) ?? null,
  };
}

export function heightBody(
  values: HeightValues,
  lengthCm: number,
  { chartedAt, clientKey }: { chartedAt: string; clientKey: string },
): HeightBody | null {
  const { method, sex } = values;
  if (!method || !sex) return null;
  const reason = values.reason.trim();
  return {
    chartedAt,
    clientKey,
    method,
    sexForPbw: sex,
    [lengthFieldOf(method)]: lengthCm,
    ...(reason && { reason }),
  };
}
