import { describe, expect, test } from "vitest";
import * as physiology from "@/lib/physiology";
import { catalogue } from "./catalogue";

const noNumbers = [NaN, Infinity, -Infinity, "12", "abc", "", null, undefined, true, {}, []];

/** Answered in words or an object, or answering about a field rather than computing: tested in files of their own. */
const testedApart = [
  "berlinSeverity",
  "globalDefinitionSeverity",
  "lungInjuryScore",
  "isRefused",
  "isUnusual",
  "slippedUnit",
  "modeSettings",
  "fieldsOfMode",
  "modeLabel",
];

const argumentsOf = catalogue.flatMap((entry) =>
  Object.entries(entry.ranges).map(([field, [min, max]]) => ({ ...entry, field, min, max })),
);

describe("what cannot be is refused at the door", () => {
  test("the catalogue holds every function that answers with a number", () => {
    const functions = Object.entries(physiology).flatMap(([name, value]) =>
      typeof value === "function" ? [name] : [],
    );
    expect([...catalogue.map(({ name }) => name), ...testedApart].sort()).toEqual(functions.sort());
  });

  test.each(catalogue)("$name computes its documented example", ({ call, example, result }) => {
    expect(call({ ...example })).toBeCloseTo(result, 3);
  });

  test.each(catalogue)("$name leaves its input as it was", ({ call, example }) => {
    const frozen = Object.freeze({ ...example });
    expect(() => call(frozen)).not.toThrow();
  });

  test.each(argumentsOf)("$name refuses $field outside $min to $max", ({ call, example, field, min, max }) => {
    for (const value of [min - 0.01, max + 0.01, min - 1000, max + 1_000_000]) {
      const calling = () => call({ ...example, [field]: value });
      expect(calling, String(value)).toThrow(RangeError);
      expect(calling).toThrow(`${field} ${value} is outside the allowed ${min} to ${max}`);
    }
  });

  test.each(argumentsOf)("$name refuses a $field that is no finite number", ({ call, example, field, min, max }) => {
    for (const value of noNumbers) {
      // An argument with a default may be left out.
      if (field === "respiratoryQuotient" && value === undefined) continue;
      const calling = () => call({ ...example, [field]: value });
      expect(calling, String(value)).toThrow(RangeError);
      expect(calling).toThrow(`${field} must be a number`);
      expect(calling).toThrow(`allowed ${min} to ${max}`);
    }
  });

  test.each(catalogue.filter(({ example }) => "sex" in example))("$name refuses a sex it was not given", (entry) => {
    for (const sex of [null, undefined, "", "M", "other"]) {
      expect(() => entry.call({ ...entry.example, sex })).toThrow(/^sex .* cannot be used: allowed male or female$/);
    }
  });

  test.each(catalogue.filter(({ ranges }) => "fio2" in ranges))(
    "S1 $name refuses an FiO2 off the whole percent",
    (entry) => {
      for (const fio2 of [0.405, 0.2101, 0.999, 0.400_001]) {
        expect(() => entry.call({ ...entry.example, fio2 })).toThrow(/^fio2 .* is not a whole percent/);
      }
      expect(() => entry.call({ ...entry.example, fio2: 0.1 + 0.2 })).not.toThrow();
    },
  );
});
