import { RangeTrack } from "@/components/figures/range-track";
import type { RangeTrackProps } from "@/components/figures/range-track-props";
import { trackDomains } from "@/components/figures/track-domain";
import { render, screen } from "@testing-library/react";
import { describe, expect, it } from "vitest";
import { box, part } from "./drawn";

const plateau: RangeTrackProps = {
  metric: "plateauCmH2O",
  name: "Plateau",
  value: 27,
  state: "inside",
  limit: { max: 30, origin: "order" },
  width: 100,
};

function draw(others: Partial<RangeTrackProps> = {}): Element {
  render(<RangeTrack {...plateau} {...others} />);
  return screen.getByRole("img");
}

const shape = (figure: Element) => figure.querySelector("[data-shape]")?.getAttribute("data-shape") ?? null;

describe("the range track", () => {
  it("keeps the fixed domains", () => {
    expect(trackDomains).toMatchObject({
      vtMlPerKg: [3, 10],
      plateauCmH2O: [15, 40],
      drivingPressureCmH2O: [5, 25],
      pao2MmHg: [40, 110],
      spo2Percent: [85, 100],
      rass: [-5, 4],
    });
  });

  it("inside: a filled disc at its place, the band up to a post at the limit", () => {
    const figure = draw();
    expect(shape(figure)).toBe("disc");
    expect(figure.querySelector("[data-shape]")).toHaveAttribute("cx", "48");
    expect(box(figure, "band")).toMatchObject({ x: 0, width: 60 });
    expect(figure.querySelectorAll('[data-part="post"]')).toHaveLength(1);
    expect(figure).toHaveAccessibleName("Plateau 27, inside; ordered up to 30.");
  });

  it("at the edge: a half disc on the post", () => {
    const figure = draw({ value: 30, state: "edge" });
    expect(shape(figure)).toBe("half-disc");
    expect(figure.querySelector("[data-shape]")).toHaveAttribute("data-x", "60");
    expect(figure).toHaveAccessibleName("Plateau 30, at the edge; ordered up to 30.");
  });

  it("outside: a diamond on a tether as long as the value is out", () => {
    const figure = draw({ value: 34, state: "outside" });
    expect(shape(figure)).toBe("diamond");
    expect(part(figure, "tether")).toHaveAttribute("d", "M60 10H76");
    expect(part(figure, "tether")).toHaveAttribute("stroke-width", "3.5");
  });

  it("outside below the range is tethered to the lower post", () => {
    const figure = draw({
      metric: "spo2Percent",
      name: "SpO2",
      value: 86.5,
      state: "outside",
      limit: { min: 88, max: 95, origin: "default" },
    });
    expect(part(figure, "tether")?.getAttribute("d")).toMatch(/^M20 10H10/);
    expect(figure).toHaveAccessibleName("SpO2 87, outside; default 88 to 95.");
  });

  it("not measured: a dashed ring at the last value on a dashed line", () => {
    const figure = draw({ value: null, lastValue: 26, state: "unmeasured" });
    expect(shape(figure)).toBe("dashed-ring");
    expect(figure.querySelector("[data-shape]")).toHaveAttribute("cx", "44");
    expect(part(figure, "baseline")?.getAttribute("stroke-dasharray")).toBeTruthy();
    expect(part(figure, "band")).toHaveAttribute("fill", "var(--unm-line)");
    expect(figure).toHaveAccessibleName("Plateau not measured, was 26; ordered up to 30.");
  });

  it("F7 not measured, last outside: a dashed diamond, still tethered", () => {
    const figure = draw({ value: null, lastValue: 34, state: "unmeasured", lastState: "outside" });
    expect(shape(figure)).toBe("dashed-diamond");
    expect(part(figure, "tether")).toHaveAttribute("d", "M60 10H76");
    expect(figure).toHaveAccessibleName("Plateau not measured, was 34, outside; ordered up to 30.");
  });

  it("never measured: line and band without a marker", () => {
    const figure = draw({ value: null, lastValue: null, state: "unmeasured" });
    expect(shape(figure)).toBeNull();
    expect(figure).toHaveAccessibleName("Plateau not measured; ordered up to 30.");
  });

  it("not asked: no marker", () => {
    expect(shape(draw({ value: null, state: "not-asked" }))).toBeNull();
  });

  it("a value beyond the domain stops at the track's end", () => {
    expect(part(draw({ value: 60, state: "outside" }), "tether")).toHaveAttribute("d", "M60 10H100");
  });

  it("a limit beyond the domain has no post", () => {
    expect(draw({ limit: { max: 45, origin: "order" } }).querySelectorAll('[data-part="post"]')).toHaveLength(0);
  });

  it("S1 says 30.04 where two decimals tell the side of the limit", () => {
    expect(draw({ value: 30.04, state: "outside" })).toHaveAccessibleName("Plateau 30.04, outside; ordered up to 30.");
  });
});
