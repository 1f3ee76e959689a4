import { z } from "zod";
import { charted } from "./fields";

/** Best first: a lower method replaces a higher one only with a reason. */
export const heightMethods = [
  "measured-standing",
  "measured-lying",
  "document",
  "ulna",
  "knee-height",
  "demispan",
  "reported",
] as const;

export type HeightMethod = (typeof heightMethods)[number];

/** The length each method measures; the others give the height itself. */
export const lengthOfMethod = { ulna: "ulnaCm", "knee-height": "kneeHeightCm", demispan: "demispanCm" } as const;

export const heightShape = {
  method: z.enum(heightMethods),
  sexForPbw: z.enum(["male", "female"], { error: "Say which sex is used for PBW: it cannot be guessed." }),
  heightCm: charted("heightCm").optional(),
  ulnaCm: charted("ulnaCm").optional(),
  demispanCm: charted("demispanCm").optional(),
  kneeHeightCm: charted("kneeHeightCm").optional(),
};

const lengths = ["heightCm", "ulnaCm", "demispanCm", "kneeHeightCm"] as const;

/** Exactly the length the method asks for, and no other. */
export function heightIssues(
  height: { method: HeightMethod } & Partial<Record<(typeof lengths)[number], number | undefined>>,
) {
  const asked =
    (lengthOfMethod as Partial<Record<HeightMethod, (typeof lengths)[number]>>)[height.method] ?? "heightCm";
  const issues = lengths
    .filter((name) => name !== asked && height[name] !== undefined)
    .map((name) => ({ path: name as string, message: "This method does not use that length." }));
  if (height[asked] === undefined) issues.push({ path: asked, message: "Enter the length that was measured, in cm." });
  return issues;
}
