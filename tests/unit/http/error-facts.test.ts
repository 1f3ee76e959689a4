import { UniqueConstraintError } from "sequelize";
import { describe, expect, it } from "vitest";
import { errorFacts } from "@/lib/http/error-facts";

describe("what the log says of an error", () => {
  it("is the code and constraint of a database error, and no value it carries", () => {
    const parent = Object.assign(new Error('duplicate key: "Doe, Jane"'), {
      code: "23505",
      constraint: "patients_hospital_mrn_uq",
      sql: "INSERT INTO patients VALUES ('Doe, Jane')",
    });
    const facts = errorFacts(
      new UniqueConstraintError({ parent, message: "Doe, Jane", fields: { name: "Doe, Jane" } }),
    );
    expect(facts).toMatchObject({ code: "23505", constraint: "patients_hospital_mrn_uq" });
    expect(JSON.stringify(facts)).not.toContain("Doe");
  });

  it("is no charted value that the core refused", () => {
    const facts = errorFacts(new Error("not computed", { cause: new RangeError("plateauCmH2O 245 is refused") }));
    expect(facts.cause?.name).toBe("RangeError");
    expect(JSON.stringify(facts)).not.toContain("245");
  });

  it("keeps where it came from", () => {
    expect(errorFacts(new TypeError("x is undefined"))).toMatchObject({ name: "TypeError", message: "x is undefined" });
    expect(errorFacts(new TypeError("x is undefined")).frames).toContain("error-facts.test");
  });

  it("stands what is thrown without being an error", () => {
    expect(errorFacts("text")).toEqual({ name: "string" });
  });
});
