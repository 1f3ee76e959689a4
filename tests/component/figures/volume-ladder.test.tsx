import { flagLeft } from "@/components/figures/ladder-flag";
import type { VolumeLadderProps } from "@/components/figures/ladder-reading";
import { ladderRungs } from "@/components/figures/ladder-rungs";
import { VolumeLadder } from "@/components/figures/volume-ladder";
import { render, screen } from "@testing-library/react";
import { describe, expect, it } from "vitest";
import { box, part, written } from "./drawn";

/** PBW of a man of 175 cm: 50 + 0.91 × (175 − 152.4) (ARDS Network). */
const pbwKg = 70.566;
const order = { min: 5, max: 7, origin: "order" } as const;

function reading(tidalVolumeMl: number, state: "inside" | "edge" | "outside" | "unmeasured" = "inside") {
  return { tidalVolumeMl, mlPerKg: tidalVolumeMl / pbwKg, state };
}

function draw(others: Partial<VolumeLadderProps> = {}): Element {
  render(<VolumeLadder pbwKg={pbwKg} order={order} reading={reading(420)} {...others} />);
  return screen.getByRole("img");
}

const shape = (figure: Element) => part(figure, "marker")?.querySelector("[data-shape]")?.getAttribute("data-shape");

describe("the volume ladder", () => {
  it("S7 writes ordered limits rounded inward and other rungs half-up", () => {
    const rungs = ladderRungs({ pbwKg, order, labelRoom: 0.7 });
    expect(rungs.map(({ mlPerKg, ml }) => [mlPerKg, ml])).toEqual([
      [4, 282],
      [5, 353],
      [6, 423],
      [7, 493],
      [8, 565],
      [10, 706],
      [12, 847],
    ]);
  });

  it("flags the volume, mL/kg and the state over the marker", () => {
    const figure = draw();
    expect(part(figure, "flag")).toHaveTextContent("420 mL, 6.0 mL/kg, inside");
    expect(shape(figure)).toBe("disc");
    expect(part(figure, "marker")).toHaveAttribute("x", "24.398%");
    expect(figure).toHaveAccessibleName(
      "Volume ladder: 420 mL, 6.0 mL/kg, inside. Ordered 5 to 7 mL/kg, 353 to 493 mL.",
    );
  });

  it("shades the order between its two heavier rungs", () => {
    const figure = draw();
    expect(part(figure, "band")).toHaveAttribute("x", "12.5%");
    expect(part(figure, "band")).toHaveAttribute("width", "25%");
    const limits = [...figure.querySelectorAll('[data-part="ordered-limit"]')];
    expect(limits.map((rung) => rung.getAttribute("data-ml-per-kg"))).toEqual(["5", "7"]);
    expect(limits.every((rung) => rung.getAttribute("y1") === "31" && rung.getAttribute("y2") === "69")).toBe(true);
  });

  it("outside: a diamond tethered to the limit it is beyond", () => {
    const figure = draw({ reading: reading(520, "outside") });
    expect(shape(figure)).toBe("diamond");
    expect(part(figure, "tether")).toHaveAttribute("x1", "37.5%");
    expect(figure).toHaveAccessibleName(expect.stringContaining("520 mL, 7.4 mL/kg, outside"));
  });

  it("at the edge: a half disc", () => {
    expect(shape(draw({ reading: reading(490, "edge") }))).toBe("half-disc");
  });

  it("not measured: a dashed ring at the last volume", () => {
    const figure = draw({ reading: reading(400, "unmeasured") });
    expect(shape(figure)).toBe("dashed-ring");
    expect(part(figure, "flag")).toHaveTextContent("not measured");
  });

  it.each([
    [990, "100%", "990 mL, 14.0 mL/kg, outside"],
    [220, "0%", "220 mL, 3.1 mL/kg, outside"],
  ])("%d mL stops at the rail's end and the flag tells the true number", (ml, x, words) => {
    const figure = draw({ reading: reading(ml, "outside") });
    expect(part(figure, "marker")).toHaveAttribute("x", x);
    expect(part(figure, "flag")).toHaveTextContent(words);
  });

  it("S2 a set volume that counts as on the limit is not written beyond it", () => {
    const figure = draw({ order: { min: 6, max: 8, origin: "order" }, reading: reading(420, "edge") });
    expect(part(figure, "flag")).toHaveTextContent("420 mL, 6.0 mL/kg, at the edge");
  });

  it("S1 writes the decimals that tell the side of the limit", () => {
    const figure = draw({ reading: { tidalVolumeMl: 495.4, mlPerKg: 7.02, state: "outside" } });
    expect(part(figure, "flag")).toHaveTextContent("7.02 mL/kg, outside");
  });

  it("says when it is judged on the set volume alone, and why", () => {
    const note = "judged on the set volume alone: exhaled volume not measured since the change at 22:40";
    const figure = draw({ reading: { ...reading(390), set: true }, note });
    expect(part(figure, "flag")).toHaveTextContent("390 mL set, 5.5 mL/kg, inside");
    expect(written(figure)).toContain(note);
    expect(figure).toHaveAccessibleName(expect.stringContaining(note));
  });

  it("an ordered limit off the rungs gets one, and neighbours make room for its words", () => {
    const figure = draw({ order: { min: 4, max: 6.5, origin: "default" } });
    expect(figure.querySelector('[data-label="6.5"]')).toHaveTextContent("458");
    expect(figure.querySelector('[data-label="6"]')).toBeNull();
    expect(figure.querySelector('[data-part="rung"][data-ml-per-kg="6"]')).not.toBeNull();
    expect(figure).toHaveAccessibleName(expect.stringContaining("Default 4 to 6.5 mL/kg, 283 to 458 mL"));
  });

  it("an order without a minimum is shaded from the rail's end", () => {
    const figure = draw({ order: { max: 6, origin: "order" } });
    expect(part(figure, "band")).toHaveAttribute("x", "0%");
    expect(figure).toHaveAccessibleName(expect.stringContaining("Ordered up to 6 mL/kg, 423 mL"));
  });

  it("is drawn without a marker while no volume is known", () => {
    const figure = draw({ reading: null });
    expect(part(figure, "marker")).toBeNull();
    expect(figure).toHaveAccessibleName(expect.stringContaining("no tidal volume"));
  });

  it("without a height there is no ladder but the way to one", () => {
    render(<VolumeLadder pbwKg={null} order={order} reading={null} action={<button>Measure height</button>} />);
    expect(screen.queryByRole("img")).toBeNull();
    expect(screen.getByText("Measure height to see millilitres")).toBeVisible();
    expect(screen.getByRole("button", { name: "Measure height" })).toBeVisible();
  });

  it.each([
    ["full", 108, 26],
    ["compact", 90, 20],
    ["phone", 80, 24],
  ] as const)("%s is %d px tall with rails %d px apart", (size, height, apart) => {
    const figure = draw({ size });
    expect(figure).toHaveAttribute("height", String(height));
    expect(box(figure, "band").height).toBe(apart);
  });

  it("the phone has no flag and bare mL/kg", () => {
    const figure = draw({ size: "phone" });
    expect(part(figure, "flag")).toBeNull();
    expect(figure.querySelector('[data-label="5"]')).toHaveTextContent("3535");
  });
});

describe("the flag", () => {
  const flag = { width: 228, leastWidth: 720, inset: 40 };

  it("is centred on its marker away from the ends", () => {
    expect(flagLeft({ ...flag, share: 0.244 })).toBe(-114);
  });

  it.each([0, 0.02, 0.05, 0.08, 0.92, 0.97, 1])("stays over the ladder at %d of its length, at any width", (share) => {
    for (const ladderWidth of [720, 900, 1100]) {
      const left = share * ladderWidth + flagLeft({ ...flag, share });
      expect(left).toBeGreaterThanOrEqual(-40.001);
      expect(left + flag.width).toBeLessThanOrEqual(ladderWidth + 40.001);
    }
  });
});
