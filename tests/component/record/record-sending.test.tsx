import { act, fireEvent, screen, waitFor, within } from "@testing-library/react";
import { afterEach, beforeEach, describe, expect, it, vi } from "vitest";
import { buildWorksheet, settingsCharted, testNow } from "./build-worksheet";
import { charted, lost, problem, stubNetwork } from "./network";
import { renderRecord } from "./render-record";

vi.setConfig({ testTimeout: 30_000 });

const worksheet = buildWorksheet();
const button = (name: string | RegExp) => screen.getByRole("button", { name });
const saved = () => charted(worksheet);
const author = { id: "9", name: "Ines Lindqvist" };
const meanwhile = (field: string, yours: number | string | null, basedOn: number | string, value: number | string) => ({
  field,
  yours,
  basedOn,
  inForce: { value, entryId: "700", chartedAt: "2026-12-01T14:18:00+01:00", author },
});

async function raisePeep(user: ReturnType<typeof renderRecord>["user"]) {
  await user.click(button("PEEP, more"));
  await user.click(button("PEEP, more"));
}

beforeEach(() => {
  localStorage.clear();
  vi.useFakeTimers({ now: new Date(testNow), toFake: ["Date"] });
});

afterEach(() => vi.unstubAllGlobals());

describe("a network that is lost", () => {
  it("keeps sending the same body under the same key until it arrives", async () => {
    const sent = stubNetwork(worksheet, lost, lost, saved);
    const { user } = renderRecord();
    await raisePeep(user);
    await user.click(button("Save"));
    expect(await screen.findByRole("heading", { name: "Kept on this device" })).toBeVisible();
    expect(await screen.findByText(/Sending, try 3/, undefined, { timeout: 9000 })).toBeVisible();
    await screen.findByRole("heading", { name: "Saved" }, { timeout: 9000 });
    expect(sent).toHaveLength(3);
    expect(new Set(sent.map(({ body }) => JSON.stringify(body))).size).toBe(1);
  });

  it("goes on under the same key after a reload", async () => {
    const first = stubNetwork(worksheet, lost);
    const { user, unmount } = renderRecord();
    await raisePeep(user);
    await user.click(button("Save"));
    await waitFor(() => expect(first.length).toBeGreaterThan(0));
    await waitFor(() => expect(localStorage.getItem("draft:2:81:record")).toContain('"route":"bedside-entries"'));
    unmount();
    const second = stubNetwork(worksheet, saved);
    renderRecord();
    await screen.findByRole("heading", { name: "Saved" });
    expect(second[0]?.body["clientKey"]).toBe(first[0]?.body["clientKey"]);
    expect(second[0]?.body).toEqual(first[0]?.body);
    await waitFor(() => expect(localStorage.getItem("draft:2:81:record")).toBeNull());
  });

  it("shows the change as charted while it is on its way, and when the hold is due", async () => {
    stubNetwork(worksheet, lost);
    const { user } = renderRecord();
    await raisePeep(user);
    await user.click(button("Save"));
    const row = await screen.findByRole("row", { name: /PEEP/ });
    expect(
      within(row)
        .getAllByRole("cell")
        .map((cell) => cell.textContent),
    ).toEqual(["10", "12"]);
    expect(screen.getByRole("heading", { name: "Hold due 14:50" })).toBeVisible();
    expect(screen.getByText(/not measured since the change at 14:20/)).toBeVisible();
    expect(button("Enter plateau")).toBeVisible();
  });
});

describe("a draft", () => {
  it("survives the page, and says that it is not saved", async () => {
    stubNetwork(worksheet, saved);
    const { user, unmount } = renderRecord();
    await raisePeep(user);
    await waitFor(() => expect(localStorage.getItem("draft:2:81:record")).toContain('"peepCmH2O":"12"'));
    unmount();
    renderRecord();
    expect(await screen.findByText(/It is not saved yet/)).toBeVisible();
    expect(screen.getByRole("spinbutton", { name: "PEEP" })).toHaveAttribute("aria-valuenow", "12");
    await user.click(button("Discard draft"));
    expect(screen.getByRole("spinbutton", { name: "PEEP" })).toHaveAttribute("aria-valuenow", "10");
    await waitFor(() => expect(localStorage.getItem("draft:2:81:record")).toBeNull());
  });

  it("is never shown to another person, nor for another episode", async () => {
    stubNetwork(worksheet, saved);
    const { user, unmount } = renderRecord();
    await raisePeep(user);
    await waitFor(() => expect(localStorage.getItem("draft:2:81:record")).not.toBeNull());
    unmount();
    const other = renderRecord({ personId: "3" });
    await act(async () => undefined);
    expect(screen.queryByText(/It is not saved yet/)).toBeNull();
    expect(screen.getByRole("spinbutton", { name: "PEEP" })).toHaveAttribute("aria-valuenow", "10");
    other.unmount();
    renderRecord({ worksheet: buildWorksheet({ episode: { ...worksheet.episode, id: "82" } }) });
    await act(async () => undefined);
    expect(screen.getByRole("spinbutton", { name: "PEEP" })).toHaveAttribute("aria-valuenow", "10");
  });

  it("names neither the patient nor the MRN", async () => {
    stubNetwork(worksheet, saved);
    const { user } = renderRecord();
    await raisePeep(user);
    await waitFor(() => expect(localStorage.getItem("draft:2:81:record")).not.toBeNull());
    const kept = JSON.stringify({ ...localStorage });
    expect(kept).not.toContain("Kaplan");
    expect(kept).not.toContain("30044417");
  });
});

describe("two people at once", () => {
  it("shows both values, and charts mine over theirs under a new key where that is chosen", async () => {
    const conflict = [meanwhile("peepCmH2O", 12, 10, 8)];
    const sent = stubNetwork(worksheet, () => problem(409, "conflict", { conflict }), saved);
    const { user } = renderRecord();
    await raisePeep(user);
    await user.click(button("Save"));
    const row = await screen.findByRole("region", { name: "PEEP" });
    expect(within(row).getByRole("button", { name: /Mine.*12/ })).toBeVisible();
    expect(within(row).getByRole("button", { name: /Theirs.*8.*Ines Lindqvist, 14:18/ })).toBeVisible();
    await user.click(button("Save with these"));
    expect(sent).toHaveLength(1);
    await user.click(within(row).getByRole("button", { name: /Mine/ }));
    await user.click(button("Save with these"));
    await waitFor(() => expect(sent).toHaveLength(2));
    expect(sent[1]?.body).toMatchObject({ settings: { peepCmH2O: 12 }, basedOn: { peepCmH2O: 8 } });
    expect(sent[1]?.body["clientKey"]).not.toBe(sent[0]?.body["clientKey"]);
  });

  it("lets theirs stand, and still charts the rest of mine", async () => {
    const conflict = [meanwhile("peepCmH2O", 12, 10, 8)];
    const sent = stubNetwork(worksheet, () => problem(409, "conflict", { conflict }), saved);
    const { user } = renderRecord();
    await raisePeep(user);
    await user.click(button("Rate, more"));
    await user.click(button("Save"));
    await user.click(await screen.findByRole("button", { name: /Theirs/ }));
    await user.click(button("Save with these"));
    await waitFor(() => expect(sent).toHaveLength(2));
    expect(sent[1]?.body).toMatchObject({ settings: { respiratoryRate: 25 }, basedOn: { respiratoryRate: 24 } });
    expect(sent[1]?.body["settings"]).not.toHaveProperty("peepCmH2O");
  });

  it("says so while typing, once the record has moved on", async () => {
    stubNetwork(worksheet, saved);
    const { user } = renderRecord();
    await user.click(button("Rate, more"));
    const later = { id: "110", chartedAt: testNow, recordedAt: testNow, author, peepCmH2O: 8 };
    const facts = { ...worksheet.facts, settings: [...(worksheet.facts?.["settings"] ?? []), later] };
    stubNetwork(buildWorksheet({ facts, at: "2026-12-01T14:20:40+01:00" }), saved);
    fireEvent(window, new Event("visibilitychange"));
    expect(await screen.findByText(/Charted meanwhile: PEEP 8/)).toBeVisible();
    await user.click(button("Fill anew"));
    expect(screen.getByRole("spinbutton", { name: "PEEP" })).toHaveAttribute("aria-valuenow", "8");
    expect(screen.getByRole("spinbutton", { name: "Rate" })).toHaveAttribute("aria-valuenow", "25");
  });
});

describe("what the server refuses", () => {
  it("is put at its field, and nothing typed is lost", async () => {
    const errors = [{ path: "settings.peepCmH2O", message: "PEEP 12 cannot be charted here." }];
    stubNetwork(worksheet, () => problem(422, "validation-failed", { errors }));
    const { user } = renderRecord();
    await raisePeep(user);
    await user.click(button("Save"));
    expect(await screen.findAllByText(/PEEP 12 cannot be charted here/)).toHaveLength(2);
    expect(screen.getByRole("spinbutton", { name: "PEEP" })).toHaveAttribute("aria-valuenow", "12");
  });

  it("keeps the typed work when the session has ended", async () => {
    stubNetwork(worksheet, () => problem(401, "locked"));
    const { user } = renderRecord();
    await raisePeep(user);
    await user.click(button("Save"));
    expect(await screen.findByText(/What you typed is kept: sign in, then save again/)).toBeVisible();
    expect(screen.getByRole("spinbutton", { name: "PEEP" })).toHaveAttribute("aria-valuenow", "12");
  });
});

describe("after saving", () => {
  it("files a void on Undo, and says so", async () => {
    const sent = stubNetwork(worksheet, saved, saved);
    const { user } = renderRecord();
    await raisePeep(user);
    await user.click(button("Save"));
    await screen.findByRole("heading", { name: "Saved" });
    expect(screen.getByText(/Undo files a void: the entry stays readable/)).toBeVisible();
    await user.click(button("Undo"));
    expect(await screen.findByRole("heading", { name: "Struck through" })).toBeVisible();
    expect(sent[1]?.path).toBe("/api/patients/71/submissions/500/void");
    expect(sent[1]?.body["reason"]).toBe("Undo: entered by mistake");
  });

  it("leads to the plateau that is due, over the settings just charted", async () => {
    stubNetwork(worksheet, saved);
    const { user } = renderRecord();
    await raisePeep(user);
    await user.click(button("Save"));
    await screen.findByRole("heading", { name: "Saved" });
    await user.click(button("Enter plateau"));
    expect(screen.getByRole("spinbutton", { name: "PEEP" })).toHaveAttribute("aria-valuenow", "12");
    await waitFor(() => expect(screen.getByRole("textbox", { name: "Plateau" })).toHaveFocus());
    expect(screen.getByRole("group", { name: "Keypad, Plateau" })).toBeVisible();
  });
});

describe("the time of an entry", () => {
  const facts = {
    settings: [
      {
        id: "101",
        chartedAt: "2026-12-01T08:00:00+01:00",
        recordedAt: "2026-12-01T08:00:00+01:00",
        author,
        ...settingsCharted,
      },
      {
        id: "103",
        chartedAt: "2026-12-01T12:00:00+01:00",
        recordedAt: "2026-12-01T12:00:00+01:00",
        author,
        peepCmH2O: 14,
      },
    ],
  };

  it("fills the form with what was in force then, says how late it is, and what it does to now", async () => {
    const late = buildWorksheet({ facts });
    const sent = stubNetwork(late, () => charted(late));
    const { user } = renderRecord({ worksheet: late });
    expect(screen.getByRole("spinbutton", { name: "PEEP" })).toHaveAttribute("aria-valuenow", "14");
    await user.click(button("Change the time, now 14:20"));
    fireEvent.change(await screen.findByLabelText("Time by the clock of Invented unit"), {
      target: { value: "11:00" },
    });
    await user.click(button(/^At 11:00, Tue 1 Dec, late by 3 h 20/));
    expect(screen.getByRole("spinbutton", { name: "PEEP" })).toHaveAttribute("aria-valuenow", "10");
    await user.click(button("FiO2, less"));
    expect(screen.getByText(/This entry is late by 3 h 20\. It alters now: FiO2\./)).toBeVisible();
    await raisePeep(user);
    expect(screen.getByText(/PEEP stays 14 now/)).toBeVisible();
    await user.click(button("Save"));
    await waitFor(() => expect(sent[0]?.body["chartedAt"]).toBe("2026-12-01T11:00:00+01:00"));
    expect(sent[0]?.body["basedOn"]).toEqual({ fio2: 0.6, peepCmH2O: 10 });
  });
});

describe("the bed", () => {
  it("that changed while the form was open is said before saving", async () => {
    stubNetwork(worksheet, saved);
    const { user } = renderRecord();
    await raisePeep(user);
    const moved = { ...worksheet.episode, bed: { id: "9", label: "9" } };
    const sent = stubNetwork(buildWorksheet({ episode: moved, at: "2026-12-01T14:20:40+01:00" }), saved);
    fireEvent(window, new Event("visibilitychange"));
    expect(await screen.findByText(/is in bed 9 now, was in bed 7/)).toBeVisible();
    await user.click(button("Save"));
    expect(sent).toHaveLength(0);
    await user.click(button("Still this patient"));
    await user.click(button("Save"));
    await waitFor(() => expect(sent).toHaveLength(1));
  });
});

describe("leaving", () => {
  it("asks while typed work is unsaved, and not before", async () => {
    stubNetwork(worksheet, saved);
    const { user, router } = renderRecord();
    await raisePeep(user);
    await user.click(screen.getByRole("link", { name: "Back to the worksheet" }));
    const question = await screen.findByRole("dialog", { name: "Leave without saving?" });
    await user.click(within(question).getByRole("button", { name: "Stay" }));
    expect(router.push).not.toHaveBeenCalled();
    await user.click(screen.getByRole("link", { name: "Back to the worksheet" }));
    await user.click(await screen.findByRole("button", { name: "Leave, keep the draft" }));
    expect(router.push).toHaveBeenCalledWith("/patients/71");
  });
});
