import { render, screen, within } from "@testing-library/react";
import userEvent from "@testing-library/user-event";
import { http, worksheetPage } from "./worksheet-page";
import { describe, expect, it } from "vitest";
import { noRights, nurseRights } from "../record/build-worksheet";
import { at, fact, firstFacts, firstReading, firstSettings, judgedWorksheet, tapeHeight } from "./judged-worksheet";

const cell = (column: string, label: string) => {
  const section = screen.getByRole("region", { name: column });
  const found = within(section)
    .getAllByText((_, element) => element?.tagName === "SPAN" && element.textContent === label)
    .map((element) => element.closest("button, div"))
    .at(0);
  if (!(found instanceof HTMLElement)) throw new Error(`no cell ${label}`);
  return found;
};

describe("the worksheet", () => {
  it("names the patient wholly: bed, full name, birth date and full MRN", () => {
    render(worksheetPage(judgedWorksheet(firstFacts)));
    const head = screen.getByRole("banner");
    expect(head).toHaveTextContent("Bed 7");
    expect(head).toHaveTextContent("Dmitri Kaplan, 58, male");
    expect(head).toHaveTextContent("born 12 Mar 1968, MRN 30044417");
    expect(head).toHaveTextContent("Height, by tape175 cm");
    expect(head).toHaveTextContent("PBW, from height70.6 kg");
  });

  it("reads across: set, measured with age, works out to with its sum", () => {
    render(worksheetPage(judgedWorksheet(firstFacts)));
    expect(cell("Set", "PEEP")).toHaveTextContent("10");
    expect(cell("Measured", "Plateau, hold relaxed")).toHaveTextContent("2 h 1024cmH2Oinside");
    expect(cell("Works out to", "Driving pressure")).toHaveTextContent("24 − 1014cmH2Oinside");
    expect(cell("Works out to", "Volume per kg")).toHaveTextContent("420 ÷ 70.66.0mL/kginside");
  });

  it("V3 V4 shows a driving pressure of 15 as at the edge after PEEP 12 with plateau 27", () => {
    const facts = {
      ...firstFacts,
      settings: [firstSettings, fact("111", at("12:20"), { peepCmH2O: 12 })],
      mechanics: [firstReading, fact("112", at("12:20"), { plateauCmH2O: 27, hold: "relaxed" as const })],
    };
    render(worksheetPage(judgedWorksheet(facts)));
    expect(cell("Works out to", "Driving pressure")).toHaveTextContent(
      "27 − 12, assumes no trapped gas15cmH2Oat the edge",
    );
  });

  it("F6 shows nothing of an old hold as current after a change of volume, and names the change", () => {
    const facts = { ...firstFacts, settings: [firstSettings, fact("111", at("12:20"), { tidalVolumeMl: 390 })] };
    render(worksheetPage(judgedWorksheet(facts)));
    const plateau = cell("Measured", "Plateau, hold relaxed");
    expect(plateau).toHaveTextContent("was 24 at 10:30");
    expect(plateau).toHaveTextContent("not measured since 12:20");
    const driving = cell("Works out to", "Driving pressure");
    expect(driving).toHaveTextContent("not measured needs plateau");
    expect(driving).toHaveTextContent("was 14 at 10:30");
    expect(cell("Measured", "Exhaled volume")).toHaveTextContent("was 415 at 10:30");
  });

  it("F7 keeps saying that a plateau was outside after a change expired it", () => {
    const high = fact("102", at("10:30"), { ...firstReading, plateauCmH2O: 33 });
    const facts = {
      ...firstFacts,
      mechanics: [high],
      settings: [firstSettings, fact("111", at("12:20"), { peepCmH2O: 8 })],
    };
    render(worksheetPage(judgedWorksheet(facts)));
    expect(cell("Measured", "Plateau, hold relaxed")).toHaveTextContent("outside at 10:30, not measured since");
  });

  it("V8 never shows a driving pressure from a hold with effort", () => {
    const facts = {
      ...firstFacts,
      mechanics: [firstReading, fact("112", at("12:30"), { plateauCmH2O: 26, hold: "effort" as const })],
    };
    render(worksheetPage(judgedWorksheet(facts)));
    expect(cell("Works out to", "Driving pressure")).toHaveTextContent("not measured");
    expect(cell("Measured", "Plateau, effort seen")).toHaveTextContent("not measuredpatient effort, repeat relaxed");
  });

  it("S1 shows 30.04 with two decimals beside a limit of 30", () => {
    const reading = fact("102", at("12:30"), { ...firstReading, plateauCmH2O: 30.04, peakCmH2O: 35 });
    render(worksheetPage(judgedWorksheet({ ...firstFacts, mechanics: [reading] })));
    expect(cell("Measured", "Plateau, hold relaxed")).toHaveTextContent("30.04");
  });

  it("asks for a height instead of drawing a ladder where there is none", () => {
    const { heights: _heights, ...facts } = firstFacts;
    render(worksheetPage(judgedWorksheet(facts, at("12:40"), { height: null, pbwKg: null })));
    expect(screen.getAllByText("Measure height to see millilitres").length).toBeGreaterThan(0);
    expect(screen.getAllByRole("link", { name: "Measure height" })[0]).toHaveAttribute(
      "href",
      "/patients/71/record?focus=height",
    );
  });

  it("says that nothing is charted yet, and judges nothing as inside", () => {
    render(worksheetPage(judgedWorksheet({ heights: [tapeHeight] })));
    expect(screen.getByRole("region", { name: "Set" })).toHaveTextContent("No settings charted yet.");
    expect(screen.queryByText("inside")).not.toBeInTheDocument();
  });

  it("offers entry only to those who may chart", () => {
    const { unmount } = render(worksheetPage(judgedWorksheet(firstFacts, at("12:40"), { can: nurseRights })));
    expect(screen.getAllByRole("link", { name: "Enter settings" }).length).toBeGreaterThan(0);
    unmount();
    render(worksheetPage(judgedWorksheet(firstFacts, at("12:40"), { can: noRights })));
    expect(screen.queryByRole("link", { name: "Enter settings" })).not.toBeInTheDocument();
    expect(screen.queryByRole("link", { name: "Enter measurements" })).not.toBeInTheDocument();
  });

  it("opens where a number comes from: sum, inputs with time and author, source", async () => {
    render(worksheetPage(judgedWorksheet(firstFacts)));
    await userEvent.click(cell("Works out to", "Driving pressure"));
    const panel = await screen.findByRole("dialog", { name: "Driving pressure: where from" }, { timeout: 10_000 });
    expect(panel).toHaveTextContent("24 − 10 = 14 cmH2O");
    expect(panel).toHaveTextContent("Plateau 24 cmH2O");
    expect(panel).toHaveTextContent("Tue 1 Dec 10:30Mara Okafor");
    expect(panel).toHaveTextContent("N Engl J Med 2015;372:747");
  });

  it("lists what is due, and since when", () => {
    render(worksheetPage(judgedWorksheet(firstFacts, at("15:00"))));
    expect(screen.getByRole("complementary")).toHaveTextContent("Hold for plateau due since 14:30");
    expect(http.unanswered).toEqual([]);
  });
});
