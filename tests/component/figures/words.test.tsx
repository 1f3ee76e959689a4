import { DeltaP } from "@/components/figures/delta";
import { Freshness, freshnessSentence, type FreshnessProps } from "@/components/figures/freshness";
import { Quantity } from "@/components/figures/quantity";
import { StateWord } from "@/components/figures/state-word";
import { Subscripted } from "@/components/figures/subscripted";
import { render, screen } from "@testing-library/react";
import { describe, expect, it } from "vitest";

const states = [
  ["inside", "inside", "disc"],
  ["edge", "at the edge", "half-disc"],
  ["outside", "outside", "diamond"],
  ["unmeasured", "not measured", "dashed-ring"],
  ["not-asked", "not asked", "dash"],
] as const;

describe("a state", () => {
  it.each(states)("%s is the word '%s'", (state, word) => {
    render(<StateWord state={state} />);
    expect(screen.getByText(word)).toBeVisible();
  });

  it.each(states)("%s has a shape of its own beside '%s': %s", (state, _word, shape) => {
    const { container } = render(<StateWord state={state} shape />);
    expect(container.querySelector("[data-shape]")).toHaveAttribute("data-shape", shape);
  });

  it("that nobody judges is not drawn", () => {
    expect(render(<StateWord state={null} />).container).toBeEmptyDOMElement();
  });

  it("F7 last outside names the time and keeps the diamond, dashed", () => {
    const { container } = render(<StateWord state="unmeasured" lastOutsideAt="14:10" shape />);
    expect(container).toHaveTextContent("outside at 14:10, not measured since");
    expect(container.querySelector("[data-shape]")).toHaveAttribute("data-shape", "dashed-diamond");
  });
});

const sentences: [FreshnessProps, string, string][] = [
  [{ freshness: "current", age: "2 h 10" }, "2 h 10", "2 h 10 ago"],
  [{ freshness: "due", since: "22:50", age: "1 h 05" }, "due since 22:50, 1 h 05", "due since 22:50"],
  [
    { freshness: "changed-since", since: "14:20" },
    "not measured since the change at 14:20",
    "not measured since the change at 14:20",
  ],
  [
    { freshness: "changed-since", since: "18:30", changedBy: "turn" },
    "not measured since the turn at 18:30",
    "not measured since the turn at 18:30",
  ],
  [
    { freshness: "lapsed", was: "26", age: "9 h 00" },
    "not measured, was 26, 9 h 00 ago",
    "not measured, was 26, 9 h 00 ago",
  ],
  [{ freshness: "missing" }, "not measured, never", "not measured, never"],
  [{ freshness: "missing", needs: "plateau" }, "not measured, needs plateau", "not measured, needs plateau"],
  [
    { freshness: "too-soon", since: "14:20" },
    "not measured, too soon after 14:20",
    "not measured, too soon after 14:20",
  ],
];

describe("freshness", () => {
  it.each(sentences)("%o reads in full", (props, shown, spoken) => {
    expect(render(<Freshness {...props} />).container).toHaveTextContent(shown);
    expect(freshnessSentence(props)).toBe(spoken);
  });

  it("F9 falls into two parts in a narrow cell", () => {
    render(<Freshness freshness="changed-since" since="14:20" narrow />);
    expect(screen.getByText("not measured")).toBeVisible();
    expect(screen.getByText("since 14:20")).toBeVisible();
  });

  it("F9 names a turn even in a narrow cell", () => {
    render(<Freshness freshness="changed-since" since="18:30" changedBy="turn" narrow />);
    expect(screen.getByText("since the turn at 18:30")).toBeVisible();
  });
});

describe("numbers and labels", () => {
  it("draws in the decimal point and leaves the text whole", () => {
    const { container } = render(<Quantity text="6.0" />);
    expect(container).toHaveTextContent(/^6\.0$/);
    expect(container.querySelector("i.d")).toHaveTextContent(".");
  });

  it.each([
    ["SpO2", "SpO<sub>2</sub>"],
    ["FiO2 0.25", "FiO<sub>2</sub> 0.25"],
    ["PaCO2", "PaCO<sub>2</sub>"],
    ["HCO3", "HCO<sub>3</sub>"],
    ["mL/cmH2O", "mL/cmH<sub>2</sub>O"],
    ["PEEP 12", "PEEP 12"],
  ])("lowers the digit of %s", (text, html) => {
    expect(render(<Subscripted text={text} />).container.innerHTML).toBe(html);
  });

  it("speaks the drawn Δ as a word", () => {
    render(<DeltaP />);
    expect(screen.getByRole("img", { name: /delta/ })).toBeInTheDocument();
  });
});
