import fc from "fast-check";
import { describe, expect, test } from "vitest";
import { fio2FromInput, fio2TakenText } from "@/lib/format";

describe("FiO2 as typed", () => {
  test.each([
    ["0.21", 0.21],
    ["0.4", 0.4],
    [".4", 0.4],
    ["0,4", 0.4],
    ["0,60", 0.6],
    ["1", 1],
    ["1.0", 1],
    ["1,00", 1],
    ["21", 0.21],
    ["40", 0.4],
    ["40.0", 0.4],
    ["100", 1],
    ["57", 0.57],
    ["0.57", 0.57],
    [" 60 ", 0.6],
    ["60 %", 0.6],
    ["60%", 0.6],
  ])("'%s' is taken as %d", (text, fraction) => {
    expect(fio2FromInput(text)).toEqual({ fraction });
  });

  test.each(["1.01", "1,5", "2", "4", "10", "20", "20.9", "20.999"])(
    "'%s' is neither fraction nor percentage",
    (text) => {
      expect(fio2FromInput(text)).toEqual({
        refusal: `FiO2 ${text} is neither a fraction nor a percentage from room air up: enter a fraction, 0.21 to 1.00, or a percentage, 21 to 100.`,
      });
    },
  );

  test.each([
    ["0", /^FiO2 0 is below room air, 0\.21: enter/],
    ["0.2", /^FiO2 0\.2 is below room air, 0\.21: enter/],
    ["0.209", /below room air/],
    ["0.4%", /^FiO2 0\.4% is below room air, 21 %: enter/],
    ["1 %", /below room air, 21 %/],
    ["101", /^FiO2 101 is above 100 %: enter/],
    ["400", /above 100 %/],
    ["0.405", /^FiO2 0\.405 is not a whole percent: .* in steps of 1 %\.$/],
    ["40.5", /not a whole percent/],
    ["", /^FiO2 is empty: enter/],
    ["   ", /^FiO2 is empty/],
    ["abc", /^FiO2 'abc' is not a number: enter/],
    ["-0.4", /is not a number/],
    ["0.4.0", /is not a number/],
    ["1e2", /is not a number/],
    ["NaN", /is not a number/],
    ["Infinity", /is not a number/],
    ["%", /is not a number/],
    [".", /is not a number/],
  ])("'%s' is refused with a sentence that says what is accepted", (text, sentence) => {
    const answer = fio2FromInput(text);
    expect(answer).toEqual({ refusal: expect.stringMatching(sentence) });
    expect(answer).toEqual({ refusal: expect.stringContaining("0.21 to 1.00, or a percentage, 21 to 100") });
  });

  test("every whole percent is read alike as percentage, fraction and with a decimal comma", () => {
    for (let percent = 21; percent <= 100; percent += 1) {
      const fraction = percent / 100;
      const texts = [String(percent), fraction.toFixed(2), fraction.toFixed(2).replace(".", ","), `${percent} %`];
      expect(texts.map(fio2FromInput)).toEqual(texts.map(() => ({ fraction })));
    }
  });

  test("any text gives an allowed fraction or a sentence", () => {
    const typed = fc.oneof(fc.string(), fc.double().map(String), fc.integer({ min: -10, max: 200 }).map(String));
    fc.assert(
      fc.property(typed, (text) => {
        const answer = fio2FromInput(text);
        if ("refusal" in answer) expect(answer.refusal).toMatch(/^FiO2 [\s\S]*\.$/);
        else expect(answer.fraction >= 0.21 && answer.fraction <= 1).toBe(true);
      }),
    );
  });

  test("the form says which it took, and nothing for what is refused", () => {
    expect(fio2TakenText("60")).toBe("taken as 60 %, 0.60");
    expect(fio2TakenText("0,6")).toBe("taken as 60 %, 0.60");
    expect(fio2TakenText("1")).toBe("taken as 100 %, 1.00");
    expect(fio2TakenText("10")).toBeNull();
  });
});
