import { PressureSpan } from "@/components/figures/pressure-span";
import { spanMetrics } from "@/components/figures/span-metrics";
import type { PressureSpanProps } from "@/components/figures/span-reading";
import { cleanup, render, screen } from "@testing-library/react";
import { describe, expect, it } from "vitest";
import { box, part, written } from "./drawn";
import { measured, ordered, span, unmeasured } from "./span-readings";

function draw(props: PressureSpanProps): Element {
  render(<PressureSpan {...props} />);
  return screen.getByRole("img");
}

const { y, column } = spanMetrics("large");

describe("a measured span", () => {
  it("stands in one piece from low water to plateau while it is inside", () => {
    const figure = draw(span(measured()));
    const bar = box(figure, "bar");
    expect(bar.y).toBeCloseTo(y(24));
    expect(bar.y + bar.height).toBeCloseTo(y(12));
    expect(part(figure, "block")).toBeNull();
    expect(part(figure, "lip")).toBeNull();
    expect(part(figure, "bar")).toHaveAttribute("data-hatched", "false");
  });

  it("writes driving pressure in the bar and peak, limit, plateau and PEEP beside it", () => {
    const words = written(draw(span(measured())));
    for (const text of ["12 | driving | pressure", "peak31", "limit", "24 | plateau | 2 h 10", "12 | total PEEP"]) {
      expect(words).toContain(text);
    }
  });

  it("says the same in words", () => {
    expect(draw(span(measured()))).toHaveAccessibleName(
      "Pressure span, cmH2O: total PEEP 12; plateau 24, inside; driving pressure 12, inside; peak 31; hold 2 h 10 ago; plateau limit 30; driving pressure limit 15.",
    );
  });

  it("exactly on the driving limit carries a lip 10 px tall, wider than the column, above a gap", () => {
    const figure = draw(span(measured({ plateau: 27, driving: 15, drivingState: "edge" })));
    const [bar, lip] = [box(figure, "bar"), box(figure, "lip")];
    expect(lip.y).toBeCloseTo(y(27));
    expect(lip.height).toBeCloseTo(10);
    expect(bar.y - (lip.y + lip.height)).toBeCloseTo(2.5);
    expect([lip.x, lip.x + lip.width]).toEqual([column.left - 5, column.right + 5]);
  });

  it("27.1 over 12.1 is on the limit of 15, not over it", () => {
    const reading = measured({ plateau: 27.1, driving: 27.1 - 12.1, drivingState: "edge" });
    const figure = draw(span(reading, { lowWater: { value: 12.1, word: "total PEEP" } }));
    expect(part(figure, "lip")).not.toBeNull();
    expect(part(figure, "block")).toBeNull();
  });

  it("at the edge a little under its limit carries the lip too", () => {
    const figure = draw(
      span(measured({ plateau: 29.7, driving: 9.7, plateauState: "edge" }), {
        lowWater: { value: 20, word: "total PEEP" },
      }),
    );
    expect(part(figure, "lip")).not.toBeNull();
  });

  it("over the driving limit breaks into a bar and a wider block above a gap, told by shape alone", () => {
    const reading = measured({ plateau: 31, driving: 23, plateauState: "outside", drivingState: "outside", peak: 38 });
    const figure = draw(span(reading, { lowWater: { value: 8, word: "total PEEP" } }));
    const [bar, block] = [box(figure, "bar"), box(figure, "block")];
    expect(block.x).toBe(bar.x - 5);
    expect(block.x + block.width).toBe(bar.x + bar.width + 5);
    expect(bar.y - (block.y + block.height)).toBeCloseTo(2);
    expect(block.y).toBeCloseTo(y(31));
    expect(y(8 + 15)).toBeGreaterThan(block.y + block.height);
    expect(y(8 + 15)).toBeLessThan(bar.y);
  });

  it("over the plateau limit alone breaks at the plateau limit", () => {
    const reading = measured({ plateau: 32, driving: 14, plateauState: "outside" });
    const figure = draw(span(reading, { lowWater: { value: 18, word: "total PEEP" } }));
    const [bar, block] = [box(figure, "bar"), box(figure, "block")];
    expect(y(30)).toBeGreaterThan(block.y + block.height);
    expect(y(30)).toBeLessThan(bar.y);
  });

  it("over the limit by 0.04 still stands out above it, and says 30.04", () => {
    const reading = measured({ plateau: 30.04, driving: 14.04, plateauState: "outside" });
    const figure = draw(span(reading, { lowWater: { value: 16, word: "total PEEP" } }));
    const block = box(figure, "block");
    expect(block.height).toBeGreaterThanOrEqual(6);
    expect(block.y).toBeLessThan(y(30) - 5);
    expect(written(figure)).toContain("30.04");
    expect(figure).toHaveAccessibleName(expect.stringContaining("plateau 30.04, outside"));
  });

  it("has no whisker and no peak label without a peak", () => {
    const figure = draw(span(measured({ peak: null })));
    expect(part(figure, "whisker")).toBeNull();
    expect(written(figure)).not.toContain("peak");
  });

  it("a peak beyond 45 ends in an arrow at the ruler's end and keeps its true number", () => {
    const figure = draw(span(measured({ peak: 60 })));
    expect(part(figure, "whisker")?.getAttribute("d")).toContain(`V${y(45)}M`);
    expect(part(figure, "whisker")?.getAttribute("d")).toContain("L");
    expect(written(figure)).toContain("peak60");
  });

  it("is drawn without a limit line where the order names none", () => {
    const figure = draw(span(measured(), { limits: { plateau: null, driving: null } }));
    expect(part(figure, "limit")).toBeNull();
    expect(part(figure, "block")).toBeNull();
    expect(figure).not.toHaveAccessibleName(expect.stringContaining("limit"));
  });

  it("shows the plateau's state word in the age's place on the record form", () => {
    expect(written(draw(span(measured({ showState: true }))))).toContain("24 | plateau | inside");
  });

  it("too short for words keeps the number, and shorter still sets it beside the bar", () => {
    const short = draw(span(measured({ plateau: 16, driving: 4 })));
    expect(written(short)).not.toContain("driving");
    expect(part(short, "driving-pressure")).toHaveTextContent("4");
    cleanup();
    const shorter = draw(span(measured({ plateau: 13.5, driving: 1.5 })));
    const number = part(shorter, "driving-pressure")?.querySelector("text");
    expect(Number(number?.getAttribute("x"))).toBeLessThan(column.left);
    expect(number).toHaveAttribute("fill", "var(--accent)");
  });
});

describe("a span that is not measured since", () => {
  it("stays hatched where it was measured while PEEP line and label show the set PEEP", () => {
    const figure = draw(
      span(unmeasured({ plateau: 21, basePeep: 8, driving: 13 }), { lowWater: { value: 10, word: "PEEP, set" } }),
    );
    const bar = box(figure, "bar");
    expect(bar.y + bar.height).toBeCloseTo(y(8));
    expect(part(figure, "bar")).toHaveAttribute("data-hatched", "true");
    expect(part(figure, "bar")?.getAttribute("stroke-dasharray")).toBeTruthy();
    expect(part(figure, "peep-line")?.getAttribute("d")).toContain(`M${column.left} ${y(10)}`);
    expect(written(figure)).toContain("10 | PEEP, set");
  });

  it("says what was, and when", () => {
    const figure = draw(span(unmeasured(), { lowWater: { value: 12, word: "PEEP, set" } }));
    const words = written(figure);
    for (const text of ["not | measured | was 14", "plateau | was 26 | at 22:15", "peak | was 33"]) {
      expect(words).toContain(text);
    }
    expect(figure).toHaveAccessibleName(
      "Pressure span, cmH2O: set PEEP 12; plateau and driving pressure not measured; at 22:15 plateau was 26; driving pressure was 14; peak was 33; plateau limit 30; driving pressure limit 15.",
    );
  });

  it("has a dashed whisker", () => {
    expect(part(draw(span(unmeasured())), "whisker")).toHaveAttribute("data-hatched", "true");
  });

  it("F7 last outside keeps its overhang and gap, dashed", () => {
    const figure = draw(span(unmeasured({ plateau: 31, basePeep: 10, driving: 21, at: "14:10", lastOutside: true })));
    const [bar, block] = [box(figure, "bar"), box(figure, "block")];
    expect(block.width).toBe(bar.width + 10);
    expect(bar.y - (block.y + block.height)).toBeCloseTo(2);
    expect(part(figure, "block")).toHaveAttribute("data-hatched", "true");
    expect(part(figure, "block")).toHaveAttribute("stroke", "var(--outside)");
    expect(figure).toHaveAccessibleName(expect.stringContaining("outside at 14:10, not measured since"));
  });

  it("last inside has no overhang, even on the limit", () => {
    const figure = draw(span(unmeasured({ plateau: 27, driving: 15 })));
    expect(part(figure, "block")).toBeNull();
    expect(part(figure, "lip")).toBeNull();
  });
});

describe("a span without a current hold", () => {
  it("never measured: low water, limit and 'no plateau yet'", () => {
    const figure = draw(span({ kind: "never" }));
    expect(part(figure, "bar")).toBeNull();
    expect(part(figure, "limit")).not.toBeNull();
    expect(written(figure).replace(/\s+/g, " ")).toContain("no plateau yet");
    expect(figure).toHaveAccessibleName(expect.stringContaining("no plateau yet"));
  });

  it("a plateau just typed is hatched and asks how the hold was", () => {
    const figure = draw(span({ kind: "draft", plateau: 27 }));
    expect(part(figure, "bar")).toHaveAttribute("data-hatched", "true");
    expect(written(figure)).toContain("say how | the hold | was");
    expect(written(figure)).toContain("27 | plateau | if relaxed");
    expect(part(figure, "driving-pressure")).toBeNull();
  });

  it("V8 a hold with effort above the limit is over the mark and gives no driving pressure", () => {
    const figure = draw(span({ kind: "effort", hold: "effort", plateau: 34 }));
    expect(part(figure, "block")).toHaveAttribute("data-hatched", "false");
    expect(part(figure, "bar")).toHaveAttribute("data-hatched", "true");
    expect(part(figure, "driving-pressure")).toBeNull();
    expect(figure).toHaveAccessibleName(expect.stringContaining("patient effort, repeat relaxed"));
  });

  it("V8 a hold with effort under the limit is not over the mark, whatever the driving limit", () => {
    expect(part(draw(span({ kind: "effort", hold: "unsure", plateau: 29 })), "block")).toBeNull();
  });
});

describe("modes without a plateau", () => {
  it("pressure support: an outline from PEEP up, no limit line", () => {
    const figure = draw(span({ kind: "support", support: 10 }, { lowWater: { value: 5, word: "PEEP, set" } }));
    const outline = box(figure, "support");
    expect(outline.y).toBeCloseTo(y(15));
    expect(outline.y + outline.height).toBeCloseTo(y(5));
    expect(part(figure, "support")).toHaveAttribute("fill", "none");
    expect(part(figure, "limit")).toBeNull();
    expect(figure).toHaveAccessibleName("Pressure span, cmH2O: set PEEP 5; pressure support 10.");
  });

  it("HFOV: one line at the mean pressure, no bar, no limit line", () => {
    const figure = draw({
      lowWater: null,
      limits: ordered,
      reading: { kind: "line", value: 24, word: "mean pressure" },
    });
    expect(part(figure, "line")?.getAttribute("d")).toContain(`${y(24)}`);
    expect(part(figure, "bar")).toBeNull();
    expect(part(figure, "limit")).toBeNull();
    expect(figure).toHaveAccessibleName("Pressure span, cmH2O: mean pressure 24.");
  });

  it("APRV: P-high against the plateau limit, standing out beyond the column when over it", () => {
    const aprv = (value: number, state: "inside" | "outside") =>
      draw(span({ kind: "line", value, word: "P-high", state }, { lowWater: { value: 2, word: "P-low" } }));
    const inside = part(aprv(26, "inside"), "line")?.getAttribute("d");
    expect(inside).toMatch(new RegExp(`^M${column.left} `));
    cleanup();
    const figure = aprv(32, "outside");
    expect(part(figure, "line")?.getAttribute("d")).toMatch(new RegExp(`^M${column.left - 5} `));
    expect(part(figure, "limit")).not.toBeNull();
    expect(figure).toHaveAccessibleName("Pressure span, cmH2O: P-low 2; P-high 32, outside; plateau limit 30.");
  });

  it("high flow: the words alone", () => {
    const figure = draw({ lowWater: null, limits: ordered, reading: { kind: "words", words: "high flow 45 L/min" } });
    expect(figure).toHaveAccessibleName("Pressure span, cmH2O: high flow 45 L/min.");
    expect(part(figure, "low-water")).toBeNull();
  });
});

describe("sizes", () => {
  it.each([
    ["large", 212, 9.25],
    ["medium", 196, 8.9],
    ["phone", 182, 6],
  ] as const)("%s is %d px wide at %d px per cmH2O", (size, width, pxPerCmH2O) => {
    const figure = draw({ size, ...span(measured()) });
    expect(figure).toHaveAttribute("width", String(width));
    expect(box(figure, "column").height).toBeCloseTo(45 * pxPerCmH2O);
  });

  it.each(["large", "medium", "phone"] as const)("labels never overlap (%s)", (size) => {
    const crowded: PressureSpanProps[] = [
      span(measured({ plateau: 31, driving: 23, peak: 31.5 }), { lowWater: { value: 8, word: "total PEEP" } }),
      span(measured({ plateau: 29, driving: 3, peak: 30 }), { lowWater: { value: 26, word: "total PEEP" } }),
      span(measured({ plateau: 35, driving: 5, peak: 36 }), { lowWater: { value: 30, word: "total PEEP" } }),
      span(measured({ plateau: 6, driving: 4, peak: 8 }), { lowWater: { value: 2, word: "total PEEP" } }),
      span(unmeasured({ plateau: 31, basePeep: 10, driving: 21, peak: 32, lastOutside: true })),
    ];
    for (const props of crowded) {
      const { container, unmount } = render(<PressureSpan size={size} {...props} />);
      const labels = [...container.querySelectorAll("[data-label]")].map((label) => ({
        top: Number(label.getAttribute("data-top")),
        height: Number(label.getAttribute("data-height")),
      }));
      expect(labels.length).toBeGreaterThanOrEqual(4);
      labels.reduce((upper, lower) => {
        expect(lower.top).toBeGreaterThanOrEqual(upper.top + upper.height - 0.01);
        return lower;
      });
      unmount();
    }
  });

  it("holds no <sub>, which would break the drawing", () => {
    expect(draw(span(measured())).innerHTML).not.toContain("<sub");
  });
});
