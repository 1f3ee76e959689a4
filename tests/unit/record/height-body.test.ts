import { describe, expect, it } from "vitest";
import { checkHeight, emptyHeight, heightBody, type HeightValues } from "@/components/record/height-body";
import { heightBodySchema } from "@/lib/contracts";

const check = (values: Partial<HeightValues>, standing: HeightValues["method"] = null, ageYears = 58) =>
  checkHeight({ ...emptyHeight, ...values }, { ageYears, standing });

describe("the height form", () => {
  it("gives the PBW of a man of 175 cm. Source: reference vector 01-pbw-003", () => {
    expect(check({ method: "measured-lying", sex: "male", length: "175" }).pbwKg).toBeCloseTo(70.566, 3);
  });

  it("gives no PBW without the sex used for it, nor under 120 cm", () => {
    expect(check({ method: "measured-lying", length: "175" }).pbwKg).toBeNull();
    const short = check({ method: "measured-lying", sex: "female", length: "119", confirmed: true });
    expect(short).toMatchObject({ pbwKg: null, heightCm: 119, blocker: null });
  });

  it("estimates from the ulna. Source: reference vector 02-height-surrogate-011", () => {
    expect(check({ method: "ulna", sex: "male", length: "26.2" }).heightCm).toBeCloseTo(173.52, 2);
  });

  it("refuses knee height under 60 years, and takes it at 60", () => {
    const knee: Partial<HeightValues> = { method: "knee-height", sex: "male", length: "50" };
    expect(check(knee, null, 59).refusal).toContain("does not hold at 59 years");
    expect(check(knee, null, 60).refusal).toBeNull();
  });

  it("refuses a height in metres, and twelve inches beside feet", () => {
    expect(check({ method: "document", sex: "male", length: "1.75" }).refusal).toContain("100 to 250 cm");
    const inches = check({ method: "document", sex: "male", inFeet: true, feet: "5", inches: "12" });
    expect(inches.refusal).toBe("Enter whole feet, and inches from 0 to under 12.");
  });

  it("wants a reason only where a lower method replaces a higher one", () => {
    expect(check({ method: "ulna" }, "measured-lying").asksReason).toBe(true);
    expect(check({ method: "measured-lying" }, "ulna").asksReason).toBe(false);
    expect(check({ method: "ulna" }, "ulna").asksReason).toBe(false);
  });

  it("sends a body that the contract takes", () => {
    const values: HeightValues = { ...emptyHeight, method: "ulna", sex: "male", length: "26", reason: " knees bent " };
    const body = heightBody(values, 26, {
      chartedAt: "2026-12-01T14:20:10+01:00",
      clientKey: "7f0f3c52-95a5-4f3e-8a30-5b6a1d0c7a11",
    });
    expect(heightBodySchema.safeParse(body).error).toBeUndefined();
    expect(body).toMatchObject({ ulnaCm: 26, reason: "knees bent" });
  });
});
