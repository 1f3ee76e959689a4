import { render, screen, waitFor, within } from "@testing-library/react";
import userEvent from "@testing-library/user-event";
import { describe, expect, it } from "vitest";
import { correctedEntry, editableFields } from "@/components/history/correction-values";
import type { Entry } from "@/lib/contracts";
import { at, firstFacts, judgedWorksheet } from "./judged-worksheet";
import { http, worksheetPage } from "./worksheet-page";

const author = { id: "2", name: "Mara Okafor" };

function entry(overrides: Partial<Entry>): Entry {
  return {
    id: "102",
    kind: "mechanics",
    submissionId: "60",
    chartedAt: at("10:30"),
    recordedAt: at("10:31"),
    author,
    body: { plateauCmH2O: 24, hold: "relaxed" },
    correction: null,
    supersedesId: null,
    supersededById: null,
    reason: null,
    ...overrides,
  };
}

async function openHistory() {
  render(worksheetPage(judgedWorksheet(firstFacts)));
  await userEvent.click(screen.getByRole("button", { name: /history of Plateau/ }));
  return screen.findByRole("dialog", { name: "History of Plateau" }, { timeout: 10_000 });
}

describe("the history of a value", () => {
  it("keeps a voided entry readable, struck through, with who and why", async () => {
    http.entries = [
      entry({
        id: "130",
        correction: "void",
        supersedesId: "102",
        body: null,
        reason: "Wrong patient",
        recordedAt: at("11:00"),
      }),
      entry({ supersededById: "130" }),
    ];
    const panel = await openHistory();
    expect(await within(panel).findByRole("deletion")).toHaveTextContent("Plateau 24 cmH2O, hold relaxed");
    expect(panel).toHaveTextContent("Voided by Mara Okafor at 11:00: Wrong patient");
    expect(within(panel).queryByRole("button", { name: "Correct" })).not.toBeInTheDocument();
  });

  it("marks an entry charted more than an hour after its time as late", async () => {
    http.entries = [entry({ recordedAt: at("12:10") })];
    const panel = await openHistory();
    await waitFor(() => expect(panel).toHaveTextContent("charted late at 12:10"));
  });

  it("voids an entry only with a reason, and sends it once under one key", async () => {
    http.entries = [entry({})];
    const sheet = judgedWorksheet(firstFacts);
    http.answer = {
      status: 201,
      body: { submission: { id: "61" }, entries: [{ id: "131", kind: "mechanics" }], worksheet: sheet },
    };
    const panel = await openHistory();
    await userEvent.click(await within(panel).findByRole("button", { name: "Void" }));
    const send = within(panel).getByRole("button", { name: "Void this entry" });
    expect(send).toBeDisabled();
    await userEvent.click(within(panel).getByRole("button", { name: "Wrong reading" }));
    await userEvent.click(send);
    await waitFor(() => expect(http.sent).toHaveLength(1));
    expect(http.sent[0]).toMatchObject({
      path: "/api/patients/71/entries/102/corrections",
      body: { correction: "void", reason: "Wrong reading" },
    });
  });

  it("corrects an entry: refuses a plateau of 270 with a sentence, keeps what was typed, then sends the whole entry", async () => {
    http.entries = [entry({})];
    const sheet = judgedWorksheet(firstFacts);
    http.answer = {
      status: 201,
      body: { submission: { id: "61" }, entries: [{ id: "131", kind: "mechanics" }], worksheet: sheet },
    };
    const panel = await openHistory();
    await userEvent.click(await within(panel).findByRole("button", { name: "Correct" }));
    const plateau = within(panel).getByLabelText("Plateau, cmH2O");
    await userEvent.clear(plateau);
    await userEvent.type(plateau, "270");
    await userEvent.type(within(panel).getByLabelText("Why is it corrected?"), "slipped key");
    await userEvent.click(within(panel).getByRole("button", { name: "Save the correction" }));
    expect(panel).toHaveTextContent("Plateau 270 is outside what can be charted: enter 2 to 100 cmH2O.");
    expect(plateau).toHaveValue("270");
    expect(http.sent).toEqual([]);
    await userEvent.clear(plateau);
    await userEvent.type(plateau, "27");
    await userEvent.click(within(panel).getByRole("button", { name: "Save the correction" }));
    await waitFor(() => expect(http.sent).toHaveLength(1));
    expect(http.sent[0]?.body).toMatchObject({
      correction: "replace",
      reason: "slipped key",
      entry: { plateauCmH2O: 27, hold: "relaxed", chartedAt: at("10:30") },
    });
  });

  it("shows the server's refusal and lets the person send again under a new key", async () => {
    http.entries = [entry({})];
    http.answer = {
      status: 409,
      body: {
        type: "/problems/conflict",
        title: "t",
        status: 409,
        detail: "Somebody corrected this entry first.",
        errors: [],
      },
    };
    const panel = await openHistory();
    await userEvent.click(await within(panel).findByRole("button", { name: "Void" }));
    await userEvent.click(within(panel).getByRole("button", { name: "Wrong reading" }));
    await userEvent.click(within(panel).getByRole("button", { name: "Void this entry" }));
    expect(await within(panel).findByRole("alert")).toHaveTextContent("Somebody corrected this entry first.");
    await userEvent.click(within(panel).getByRole("button", { name: "Void this entry" }));
    await waitFor(() => expect(http.sent).toHaveLength(2));
    const [first, second] = http.sent.map(({ body }) => (body as { clientKey: string }).clientKey);
    expect(first).not.toBe(second);
  });

  it("corrects an estimated height by the length that was measured, never by the height worked out from it", () => {
    const ulna = entry({
      kind: "heights",
      body: { method: "ulna", sexForPbw: "female", ulnaCm: 25, heightCm: 164.85 },
    });
    expect(editableFields(ulna)).toEqual([{ field: "ulnaCm", text: "25" }]);
    expect(correctedEntry(ulna, { ulnaCm: "25,5" }, at("10:30"))).toEqual({
      method: "ulna",
      sexForPbw: "female",
      ulnaCm: 25.5,
      chartedAt: at("10:30"),
    });
  });
});
