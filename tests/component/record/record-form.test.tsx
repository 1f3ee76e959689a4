import { screen, waitFor, within } from "@testing-library/react";
import { afterEach, beforeEach, describe, expect, it, vi } from "vitest";
import { buildWorksheet, noRights, nurseRights, testNow } from "./build-worksheet";
import { charted, stubNetwork, type Sent } from "./network";
import { renderRecord } from "./render-record";

// By role over a whole screen is slow, and the machine may be shared.
vi.setConfig({ testTimeout: 30_000 });

let sent: Sent[];
const worksheet = buildWorksheet();
const button = (name: string | RegExp) => screen.getByRole("button", { name });
const save = () => button(/^Save/);
const result = (name: string) => screen.getByRole("group", { name });

beforeEach(() => {
  localStorage.clear();
  vi.useFakeTimers({ now: new Date(testNow), toFake: ["Date"] });
  sent = stubNetwork(worksheet, () => charted(worksheet, ["settings", "mechanics"]));
});

afterEach(() => vi.unstubAllGlobals());

describe("the commonest entry", () => {
  it("takes seven touches for PEEP 10 to 12 with a relaxed plateau of 27, and charts only what differs", async () => {
    const { user } = renderRecord();
    let touches = 0;
    const touch = async (element: HTMLElement) => {
      touches += 1;
      await user.click(element);
    };
    await touch(button("PEEP, more"));
    await touch(button("PEEP, more"));
    await touch(screen.getByRole("textbox", { name: "Plateau" }));
    await touch(button("2"));
    await touch(button("7"));
    await touch(button("relaxed"));
    expect(within(result("Driving pressure")).getByText("15")).toBeVisible();
    expect(within(result("Driving pressure")).getByText("at the edge")).toBeVisible();
    await touch(save());
    expect(touches).toBe(7);
    await screen.findByRole("heading", { name: "Saved" });
    expect(sent).toHaveLength(1);
    expect(sent[0]).toMatchObject({
      path: "/api/patients/71/bedside-entries",
      body: {
        settings: { peepCmH2O: 12 },
        mechanics: { plateauCmH2O: 27, hold: "relaxed" },
        basedOn: { peepCmH2O: 10, tidalVolumeMl: 420, mode: "A/C-VC" },
      },
    });
    expect(sent[0]?.body).not.toHaveProperty("reason");
    expect(Object.keys(sent[0]?.body["settings"] as object)).toEqual(["peepCmH2O"]);
  });

  it("can be typed on a real keyboard", async () => {
    const { user } = renderRecord();
    screen.getByRole("spinbutton", { name: "PEEP" }).focus();
    await user.keyboard("{ArrowUp}{ArrowUp}");
    screen.getByRole("textbox", { name: "Plateau" }).focus();
    await user.keyboard("27{Tab}{Enter}");
    await waitFor(() => expect(button("relaxed")).toHaveFocus());
    await user.keyboard("{Enter}");
    expect(within(result("Driving pressure")).getByText("15")).toBeVisible();
    await waitFor(() => expect(button("Plateau, how the hold was: relaxed")).toHaveFocus());
  });

  it("says 'if relaxed' and keeps Save from saving until the hold has its word", async () => {
    const { user } = renderRecord();
    await user.click(screen.getByRole("textbox", { name: "Plateau" }));
    await user.keyboard("27");
    expect(within(result("Driving pressure")).getByText("if relaxed")).toBeVisible();
    await user.click(save());
    expect(sent).toHaveLength(0);
    expect(screen.getByRole("alert")).toHaveTextContent("Say how the hold was.");
    await user.click(button("not sure"));
    await user.click(save());
    await waitFor(() => expect(sent).toHaveLength(1));
    expect(sent[0]?.body["mechanics"]).toEqual({ plateauCmH2O: 27, hold: "unsure" });
  });
});

describe("the form as opened", () => {
  it("names the patient in full, and shows what is in force, the last readings beside their fields", () => {
    renderRecord();
    expect(screen.getByRole("heading", { level: 1 })).toHaveTextContent("Dmitri Kaplan");
    expect(screen.getByText(/12 Mar 1968, MRN 30044417/)).toBeVisible();
    expect(screen.getByText("At 14:20")).toBeVisible();
    expect(screen.getByRole("spinbutton", { name: "Tidal volume" })).toHaveAttribute("aria-valuenow", "420");
    expect(screen.getByText("L/min, descending")).toBeVisible();
    expect(screen.getByText("was 24 at 10:30")).toBeVisible();
    expect(screen.getByRole("textbox", { name: "Plateau" })).toHaveValue("");
    expect(within(result("Driving pressure")).getByText("14")).toBeVisible();
    expect(screen.getByText("hold at 10:30")).toBeInTheDocument();
  });

  it("charts 'checked, unchanged' in one touch, for every setting it shows", async () => {
    const { user } = renderRecord();
    await user.click(button("Checked, unchanged"));
    await screen.findByText(/Settings checked, unchanged, at 14:20/);
    expect(sent[0]).toMatchObject({
      path: "/api/patients/71/settings-checks",
      body: { basedOn: { mode: "A/C-VC", tidalVolumeMl: 420, peepCmH2O: 10, fio2: 0.6 } },
    });
  });

  it("puts what is changed in the place of 'Checked, unchanged'", async () => {
    const { user } = renderRecord();
    await user.click(button("PEEP, more"));
    expect(screen.queryByRole("button", { name: "Checked, unchanged" })).toBeNull();
    expect(screen.getByText("changed")).toBeVisible();
    await user.click(button("PEEP, less"));
    expect(button("Checked, unchanged")).toBeVisible();
  });

  it("offers a nurse FiO2 and observations, and no other setting", () => {
    renderRecord({ worksheet: buildWorksheet({ can: nurseRights }) });
    expect(screen.getAllByRole("spinbutton").map((each) => each.getAttribute("aria-label"))).toEqual(["FiO2"]);
    expect(screen.queryByRole("textbox", { name: "Plateau" })).toBeNull();
    expect(screen.getByRole("textbox", { name: "SpO2" })).toBeVisible();
    expect(screen.queryByRole("button", { name: "Checked, unchanged" })).toBeNull();
  });

  it("says so where a person charts nothing here", () => {
    renderRecord({ worksheet: buildWorksheet({ can: noRights }) });
    expect(screen.getByText(/charts nothing/)).toBeVisible();
    expect(screen.queryByRole("button", { name: /^Save/ })).toBeNull();
  });

  it("asks for the mode first where nothing is in force", async () => {
    const { user } = renderRecord({ worksheet: buildWorksheet({ settings: null, facts: {} }) });
    await user.click(button("Choose a mode"));
    await user.click(await screen.findByRole("button", { name: /^A\/C-PC/ }));
    expect(screen.getByRole("spinbutton", { name: "Pressure above PEEP" })).toBeVisible();
    expect(screen.queryByRole("spinbutton", { name: "Tidal volume" })).toBeNull();
    await user.click(save());
    expect(screen.getByRole("alert")).toHaveTextContent("A/C-PC needs Pressure above PEEP.");
  });
});

describe("what is refused or asked", () => {
  it("refuses a slipped unit at its field, in a sentence, and sends nothing", async () => {
    const { user } = renderRecord();
    await user.click(screen.getByRole("spinbutton", { name: "FiO2" }));
    await user.keyboard("15{Escape}");
    expect(screen.getByRole("alert")).toHaveTextContent("FiO2 15 is neither a fraction nor a percentage");
    await user.click(save());
    expect(sent).toHaveLength(0);
  });

  it("takes FiO2 as a percentage too, and says which it took", async () => {
    const { user } = renderRecord();
    await user.click(screen.getByRole("spinbutton", { name: "FiO2" }));
    await user.keyboard("45");
    expect(screen.getByText(/taken as 45 %, 0\.45/)).toBeVisible();
    await user.click(save());
    await waitFor(() => expect(sent[0]?.body["settings"]).toEqual({ fio2: 0.45 }));
  });

  it("asks about an unusual value with one more tap", async () => {
    const { user } = renderRecord();
    await user.click(screen.getByRole("spinbutton", { name: "PEEP" }));
    await user.keyboard("26{Escape}");
    expect(screen.getByText("PEEP 26 cmH", { exact: false })).toBeVisible();
    await user.click(save());
    expect(sent).toHaveLength(0);
    await user.click(button("Yes, 26 cmH2O"));
    await user.click(save());
    await waitFor(() => expect(sent).toHaveLength(1));
  });

  it("asks whether breaths were stacked, and charts the answer", async () => {
    const { user } = renderRecord();
    await user.click(screen.getByRole("textbox", { name: "Exhaled volume" }));
    await user.keyboard("560{Escape}");
    await user.click(button("Yes, stacked"));
    await user.click(save());
    await waitFor(() =>
      expect(sent[0]?.body["mechanics"]).toEqual({ exhaledTidalVolumeMl: 560, breathStacking: true }),
    );
  });

  it("refuses total PEEP more than 2 below set, and asks about 2", async () => {
    const { user } = renderRecord();
    await user.click(screen.getByRole("textbox", { name: "Total PEEP" }));
    await user.keyboard("07{Escape}");
    expect(screen.getByRole("alert")).toHaveTextContent("more than 2 below the set PEEP 10");
    await user.clear(screen.getByRole("textbox", { name: "Total PEEP" }));
    await user.type(screen.getByRole("textbox", { name: "Total PEEP" }), "8{Escape}");
    expect(screen.getByRole("button", { name: "Yes, total PEEP 8" })).toBeVisible();
  });
});

describe("outside the order", () => {
  it("is never blocked, but asks a reason for a volume beyond it, and none is chosen beforehand", async () => {
    const { user } = renderRecord();
    await user.click(screen.getByRole("spinbutton", { name: "Tidal volume" }));
    await user.keyboard("520{Escape}");
    expect(result("Volume per kg")).toHaveTextContent("7.4");
    expect(within(result("Volume per kg")).getByText("outside")).toBeVisible();
    expect(screen.getByText(/Ordered 353 to 493 mL/)).toBeVisible();
    expect(screen.getByText("A reason is needed.")).toBeVisible();
    expect(screen.queryByRole("button", { pressed: true })).toBeNull();
    await user.click(button("Save, outside, with reason"));
    expect(sent).toHaveLength(0);
    await user.click(button("Breath stacking"));
    await user.click(button("Save, outside, with reason"));
    await waitFor(() => expect(sent[0]?.body["reason"]).toBe("Breath stacking"));
  });

  it("takes own words up to 200 characters", async () => {
    const { user } = renderRecord();
    await user.click(screen.getByRole("spinbutton", { name: "Tidal volume" }));
    await user.keyboard("520{Escape}");
    await user.click(button("Own words"));
    await user.type(screen.getByRole("textbox", { name: "Reason, in your own words" }), "One lung clamped");
    await user.click(button("Save, outside, with reason"));
    await waitFor(() => expect(sent[0]?.body["reason"]).toBe("One lung clamped"));
  });

  it("asks no reason for a bad measurement", async () => {
    const { user } = renderRecord();
    await user.click(screen.getByRole("textbox", { name: "Plateau" }));
    await user.keyboard("32");
    await user.click(button("relaxed"));
    expect(within(result("Driving pressure")).getByText("outside")).toBeVisible();
    await user.click(button("Save"));
    await waitFor(() => expect(sent).toHaveLength(1));
  });
});

describe("modes", () => {
  it("shows the fields of the mode chosen, prints the peak it makes, and charts the mode whole", async () => {
    const { user } = renderRecord();
    await user.click(button("Change the mode, now A/C-VC"));
    await user.click(await screen.findByRole("button", { name: /^A\/C-PC/ }));
    await user.click(screen.getByRole("spinbutton", { name: "Pressure above PEEP" }));
    await user.keyboard("14{Escape}");
    expect(screen.getByText(/peak about 24/)).toBeVisible();
    await user.click(save());
    await waitFor(() =>
      expect(sent[0]?.body["settings"]).toEqual({
        mode: "A/C-PC",
        pressureAbovePeepCmH2O: 14,
        respiratoryRate: 24,
        peepCmH2O: 10,
        fio2: 0.6,
        inspiratoryTimeS: 0.8,
      }),
    );
  });

  it("charts I:E as the inspiratory time that it stands for", async () => {
    const { user } = renderRecord();
    await user.click(button("Pattern, trigger, I:E"));
    await user.type(screen.getByRole("textbox", { name: "I:E, 1 to" }), "2");
    await user.click(save());
    await waitFor(() => expect(sent[0]?.body["settings"]).toEqual({ inspiratoryTimeS: 0.83 }));
  });
});
