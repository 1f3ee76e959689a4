import { randomUUID } from "node:crypto";
import { expect, openRecord, patientIn, post, signIn, test } from "./people";

test("typed work survives a reload, and an impossible plateau is refused with a sentence", async ({ page }) => {
  await page.setViewportSize({ width: 390, height: 844 });
  await signIn(page, "therapist");
  const patient = await patientIn(page, "6");
  await openRecord(page, patient);
  await page.getByRole("textbox", { name: "Plateau" }).click();
  for (const digit of ["2", "7", "0"]) await page.getByRole("button", { name: digit, exact: true }).click();
  await page.getByRole("button", { name: "relaxed", exact: true }).click();
  await page.getByRole("button", { name: "Save" }).click();
  await expect(
    page.getByText(/Plateau 270 is outside what can be charted: enter 2 to 100 cmH2O/).first(),
  ).toBeVisible();
  await page.reload();
  await expect(page.getByRole("textbox", { name: "Plateau" })).toHaveValue("270");
});

test("a volume outside the order is saved only with a reason", async ({ page }) => {
  await page.setViewportSize({ width: 390, height: 844 });
  await signIn(page, "therapist");
  const patient = await patientIn(page, "8");
  await openRecord(page, patient);
  const volume = page.getByRole("spinbutton", { name: "Tidal volume" });
  await volume.focus();
  for (let presses = 0; presses < 40 && !(await page.getByText("A reason is needed").isVisible()); presses += 1) {
    await page.keyboard.press("ArrowUp");
  }
  await expect(page.getByText("A reason is needed")).toBeVisible();
  await expect(page.getByRole("button", { name: "Save, outside, with reason" })).toBeVisible();
  await page.getByRole("button", { name: "Intensivist asked" }).click();
  await page.getByRole("button", { name: "Save, outside, with reason" }).click();
  await expect(page.getByText(/Saved/).first()).toBeVisible();
});

test("a lost network keeps the entry on the device and sends it once when it returns", async ({ page, context }) => {
  await signIn(page, "therapist");
  const patient = await patientIn(page, "5");
  await openRecord(page, patient);
  await page.getByRole("button", { name: "Rate, more" }).click();
  await context.setOffline(true);
  await page.getByRole("button", { name: "Save", exact: true }).click();
  await expect(page.getByText("Kept on this device")).toBeVisible();
  await expect(page.getByText(/Sending, try [2-9]/)).toBeVisible({ timeout: 20_000 });
  await context.setOffline(false);
  await expect(page.getByText(/Saved/).first()).toBeVisible({ timeout: 40_000 });
  const { entries } = (await (await page.request.get(`/api/patients/${patient}/entries?kind=settings`)).json()) as {
    entries: { recordedAt: string }[];
  };
  const fresh = entries.filter(({ recordedAt }) => Date.now() - Date.parse(recordedAt) < 90_000);
  expect(fresh).toHaveLength(1);
});

test("rights hold on the server: a nurse's settings body beyond FiO2 is 403 naming the fields", async ({ page }) => {
  await signIn(page, "nurse");
  const patient = await patientIn(page, "7");
  const now = new Date().toISOString();
  const body = {
    chartedAt: now,
    clientKey: randomUUID(),
    basedOn: { peepCmH2O: 12, fio2: 0.6 },
    peepCmH2O: 14,
    fio2: 0.5,
  };
  const answer = await post(page, `/api/patients/${patient}/settings`, body);
  expect(answer.status()).toBe(403);
  expect(JSON.stringify(await answer.json())).toContain("peepCmH2O");
  const mechanics = { chartedAt: now, clientKey: randomUUID(), plateauCmH2O: 25, hold: "relaxed" };
  expect((await post(page, `/api/patients/${patient}/mechanics`, mechanics)).status()).toBe(403);
});

test("two people at once: who saves second sees both values, chooses, and neither is lost", async ({
  page,
  browser,
}) => {
  await signIn(page, "therapist");
  const patient = await patientIn(page, "3");
  await openRecord(page, patient);
  const before = Number(await page.getByRole("spinbutton", { name: "PEEP" }).textContent());
  const other = await browser.newPage();
  await signIn(other, "intensivist");
  await openRecord(other, patient);
  await other.getByRole("button", { name: "PEEP, less" }).click();
  await other.getByRole("button", { name: "Save", exact: true }).click();
  await expect(other.getByText("Saved").first()).toBeVisible();
  await other.close();
  // This form has not heard of it yet: it is still filled from what stood before.
  await page.getByRole("button", { name: "PEEP, more" }).click();
  await page.getByRole("button", { name: "Save", exact: true }).click();
  await expect(page.getByText(/Dr L\. Lindqvist/).first()).toBeVisible();
  await expect(page.getByText(String(before - 1), { exact: true }).first()).toBeVisible();
  await expect(page.getByText(String(before + 1), { exact: true }).first()).toBeVisible();
});
