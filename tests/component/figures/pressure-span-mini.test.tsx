import { PressureSpanMini } from "@/components/figures/pressure-span-mini";
import type { PressureSpanMiniProps } from "@/components/figures/span-reading";
import { cleanup, render, screen } from "@testing-library/react";
import { describe, expect, it } from "vitest";
import { box, part, written } from "./drawn";
import { measured, ordered, span, unmeasured } from "./span-readings";

function draw(props: PressureSpanMiniProps): Element {
  render(<PressureSpanMini {...props} />);
  return screen.getByRole("img");
}

const x = (cmH2O: number) => (cmH2O / 45) * 214;

describe("the span of a row", () => {
  it("is 214 × 42, and 190 wide on a phone", () => {
    expect(draw(span(measured()))).toHaveAttribute("width", "214");
    cleanup();
    expect(draw({ size: "phone", ...span(measured()) })).toHaveAttribute("width", "190");
  });

  it("inside: one bar from PEEP to plateau with the driving pressure on it", () => {
    const figure = draw(span(measured()));
    const bar = box(figure, "bar");
    expect([bar.x, bar.x + bar.width]).toEqual([x(12), x(24)]);
    expect([bar.y, bar.height]).toEqual([6, 18]);
    expect(written(figure)).toBe("12 | 12 | 24");
    expect(part(figure, "block")).toBeNull();
    expect(part(figure, "limit")).not.toBeNull();
    expect(part(figure, "whisker")).toHaveAttribute("data-hatched", "false");
  });

  it("at the edge: a lip 5 px wide, taller than the bar, beyond a gap of 2 px", () => {
    const figure = draw(span(measured({ plateau: 27, driving: 15, drivingState: "edge" })));
    const [bar, lip] = [box(figure, "bar"), box(figure, "lip")];
    expect(lip.width).toBeCloseTo(5);
    expect(lip.x - (bar.x + bar.width)).toBeCloseTo(2);
    expect([lip.y, lip.y + lip.height]).toEqual([3, 27]);
  });

  it("over the mark: a taller block beyond a gap of 2 px, told by shape alone", () => {
    const reading = measured({ plateau: 31, driving: 23, plateauState: "outside", drivingState: "outside" });
    const figure = draw(span(reading, { lowWater: { value: 8, word: "total PEEP" } }));
    const [bar, block] = [box(figure, "bar"), box(figure, "block")];
    expect(block.x - (bar.x + bar.width)).toBeCloseTo(2);
    expect([bar.y - block.y, block.height - bar.height]).toEqual([3, 6]);
    expect(block.x + block.width).toBeCloseTo(x(31));
    expect(block.x).toBeGreaterThan(x(23));
    expect(bar.x + bar.width).toBeLessThan(x(23));
  });

  it("a limit tick keeps a halo of paper on both sides", () => {
    const strokes = [...(part(draw(span(measured())), "limit")?.querySelectorAll("path") ?? [])].map((path) =>
      path.getAttribute("stroke-width"),
    );
    expect(strokes).toEqual(["4", "2"]);
  });

  it("not measured: hatched where it was, 'was 14' on a plate, PEEP line at the set PEEP", () => {
    const figure = draw(
      span(unmeasured({ plateau: 21, basePeep: 8, driving: 13 }), { lowWater: { value: 10, word: "PEEP, set" } }),
    );
    expect(box(figure, "bar").x).toBeCloseTo(x(8));
    expect(part(figure, "bar")).toHaveAttribute("data-hatched", "true");
    expect(part(figure, "plate")).toHaveTextContent("was 13");
    expect(part(figure, "plate")?.querySelector("rect")).not.toBeNull();
    expect(part(figure, "peep-line")?.getAttribute("d")).toContain(`M${x(10)} `);
    expect(part(figure, "whisker")).toHaveAttribute("data-hatched", "true");
  });

  it("F7 last outside: the overhang stays, hatched, dashed in the outside colour", () => {
    const figure = draw(span(unmeasured({ plateau: 31, basePeep: 10, driving: 21, lastOutside: true })));
    expect(part(figure, "block")).toHaveAttribute("data-hatched", "true");
    expect(part(figure, "block")).toHaveAttribute("stroke", "var(--outside)");
    expect(box(figure, "block").height).toBe(24);
    expect(figure).toHaveAccessibleName(expect.stringContaining("outside at 22:15, not measured since"));
  });

  it("never measured: the strip and 'no plateau yet'", () => {
    const figure = draw(span({ kind: "never" }, { lowWater: { value: 8, word: "PEEP, set" } }));
    expect(part(figure, "low-water")).not.toBeNull();
    expect(part(figure, "bar")).toBeNull();
    expect(written(figure)).toContain("no plateau yet");
  });

  it("a plateau just typed asks for its hold; one with effort says so", () => {
    expect(part(draw(span({ kind: "draft", plateau: 27 })), "plate")).toHaveTextContent("hold?");
    cleanup();
    const figure = draw(span({ kind: "effort", hold: "effort", plateau: 34 }));
    expect(part(figure, "plate")).toHaveTextContent("effort");
    expect(part(figure, "block")).toHaveAttribute("data-hatched", "false");
  });

  it("pressure support: an outline, its words right of it, no limit tick", () => {
    const figure = draw(span({ kind: "support", support: 10 }, { lowWater: { value: 5, word: "PEEP, set" } }));
    expect(box(figure, "support").width).toBeCloseTo(x(10));
    expect(written(figure)).toContain("support 10");
    expect(part(figure, "limit")).toBeNull();
  });

  it("HFOV and APRV: a line; high flow: words", () => {
    const hfov = draw({ lowWater: null, limits: ordered, reading: { kind: "line", value: 24, word: "mean pressure" } });
    expect(part(hfov, "line")?.getAttribute("d")).toContain(`M${x(24)} `);
    expect(part(hfov, "limit")).toBeNull();
    cleanup();
    const aprv = draw({ lowWater: null, limits: ordered, reading: { kind: "line", value: 26, word: "P-high" } });
    expect(part(aprv, "limit")).not.toBeNull();
    cleanup();
    const flow = draw({ lowWater: null, limits: ordered, reading: { kind: "words", words: "high flow 45 L/min" } });
    expect(written(flow)).toBe("high flow 45 L/min");
  });

  it("a bar under 24 px prints its number above itself", () => {
    const figure = draw(span(measured({ plateau: 16, driving: 4 })));
    expect(Number(part(figure, "driving-pressure")?.getAttribute("y"))).toBeLessThan(6);
  });

  it("keeps the numbers under close edges apart", () => {
    const figure = draw(span(measured({ plateau: 24, driving: 2 }), { lowWater: { value: 22, word: "total PEEP" } }));
    const at = (name: string) => Number(part(figure, name)?.getAttribute("x"));
    expect(at("high-number") - at("low-number")).toBeGreaterThanOrEqual(20);
  });
});
