import { screen, waitFor } from "@testing-library/react";
import { afterEach, beforeEach, describe, expect, it, vi } from "vitest";
import { buildWorksheet, testNow } from "./build-worksheet";
import { charted, stubNetwork } from "./network";
import { renderRecord } from "./render-record";

vi.setConfig({ testTimeout: 30_000 });

const button = (name: string | RegExp) => screen.getByRole("button", { name });
const radio = (name: string | RegExp) => screen.getByRole("radio", { name });
const without = buildWorksheet({ height: null, pbwKg: null });

beforeEach(() => {
  localStorage.clear();
  vi.useFakeTimers({ now: new Date(testNow), toFake: ["Date"] });
});

afterEach(() => vi.unstubAllGlobals());

describe("height", () => {
  it("is measured from the header where none is charted, and never guesses the sex", async () => {
    const sent = stubNetwork(without, () => charted(without, ["heights"]));
    const { user } = renderRecord({ worksheet: without });
    await user.click(screen.getAllByRole("button", { name: "Measure height" })[0]!);
    await user.click(radio("Measured lying, by tape"));
    await user.type(screen.getByRole("textbox", { name: "Height, cm" }), "175");
    await user.click(button("Save height"));
    expect(screen.getByRole("alert")).toHaveTextContent("Say which sex is used for PBW.");
    expect(sent).toHaveLength(0);
    await user.click(radio("Male"));
    // PBW of a man of 175 cm is 70.566 kg. Source: reference vector 01-pbw-003.
    expect(screen.getByText(/PBW 70\.6 kg/)).toBeVisible();
    await user.click(button("Save height"));
    await waitFor(() => expect(sent).toHaveLength(1));
    expect(sent[0]).toMatchObject({
      path: "/api/patients/71/heights",
      body: { method: "measured-lying", heightCm: 175, sexForPbw: "male" },
    });
    await waitFor(() => expect(screen.queryByRole("dialog")).toBeNull());
  });

  it("takes feet and inches, and charts centimetres", async () => {
    const sent = stubNetwork(without, () => charted(without, ["heights"]));
    const { user } = renderRecord({ worksheet: without, focus: "height" });
    await user.click(radio("From a document"));
    await user.click(button("in ft and in"));
    await user.type(screen.getByRole("textbox", { name: "Feet" }), "5");
    await user.type(screen.getByRole("textbox", { name: "Inches" }), "10");
    await user.click(radio("Male"));
    await user.click(button("Save height"));
    // 5 ft 10 in is 177.8 cm: 2.54 cm an inch, exactly (UCUM).
    await waitFor(() => expect(sent[0]?.body["heightCm"]).toBe(177.8));
  });

  it("asks about an unusual length, and refuses an impossible one", async () => {
    const sent = stubNetwork(without, () => charted(without, ["heights"]));
    const { user } = renderRecord({ worksheet: without, focus: "height" });
    await user.click(radio("Measured standing"));
    await user.click(radio("Female"));
    const field = screen.getByRole("textbox", { name: "Height, cm" });
    await user.type(field, "1.75");
    expect(screen.getByText(/Height 1\.75 is outside what can be charted/)).toBeVisible();
    await user.clear(field);
    await user.type(field, "140");
    await user.click(button("Save height"));
    expect(sent).toHaveLength(0);
    await user.click(button("Yes, that is right"));
    await user.click(button("Save height"));
    await waitFor(() => expect(sent).toHaveLength(1));
  });

  it("wants a reason where a lower method replaces a higher one", async () => {
    const measured = buildWorksheet();
    const sent = stubNetwork(measured, () => charted(measured, ["heights"]));
    const { user } = renderRecord({ worksheet: measured, focus: "height" });
    await user.click(radio("Estimated from the ulna"));
    await user.type(screen.getByRole("textbox", { name: "Ulna, elbow to wrist, cm" }), "26");
    await user.click(button("Save height"));
    expect(screen.getByRole("alert")).toHaveTextContent("Say why a lower method replaces the one before.");
    await user.type(screen.getByRole("textbox", { name: /Why does this replace/ }), "Tape read with knees bent");
    await user.click(button("Save height"));
    await waitFor(() =>
      expect(sent[0]?.body).toMatchObject({ method: "ulna", ulnaCm: 26, reason: "Tape read with knees bent" }),
    );
  });
});
