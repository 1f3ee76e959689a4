import { expect, openRecord, patientIn, signIn, test } from "./people";

test.describe.configure({ mode: "serial" });

test("seven touches chart PEEP 10 to 12 with plateau 27 on a phone, with mL/kg and driving pressure before saving", async ({
  page,
}) => {
  await page.setViewportSize({ width: 390, height: 844 });
  await signIn(page, "therapist");
  const patient = await patientIn(page, "7");
  await openRecord(page, patient);
  await expect(page.getByRole("spinbutton", { name: "PEEP" })).toHaveText("10");
  let touches = 0;
  const touch = async (name: string | RegExp) => {
    touches += 1;
    await page.getByRole("button", { name, exact: typeof name === "string" }).click();
  };
  const began = Date.now();
  await touch("PEEP, more");
  await touch("PEEP, more");
  touches += 1;
  await page.getByRole("textbox", { name: "Plateau" }).click();
  await touch("2");
  await touch("7");
  await expect(page.locator("[data-record-foot]")).toContainText("if relaxed");
  await touch("relaxed");
  const result = page.locator("[data-record-foot]");
  await expect(result).toContainText("6.0");
  await expect(result).toContainText("15");
  await expect(result).toContainText("at the edge");
  await touch("Save");
  await expect(page.getByText(/Saved/).first()).toBeVisible();
  expect(touches).toBe(7);
  test.info().annotations.push({ type: "seconds", description: ((Date.now() - began) / 1000).toFixed(1) });
  console.log(`    commonest entry: ${touches} touches, ${((Date.now() - began) / 1000).toFixed(1)} s by script`);
});

test("the nurse sees the span turn to 15, at the edge, and may chart FiO2 alone", async ({ page }) => {
  await signIn(page, "nurse");
  const patient = await patientIn(page, "7");
  await page.goto(`/patients/${patient}`);
  const span = page.getByRole("img", { name: /driving pressure 15/i }).first();
  await expect(span).toBeVisible();
  await expect(page.getByRole("region", { name: "Works out to" })).toContainText("27 − 12");
  await page.getByRole("link", { name: "Enter settings" }).first().click();
  await expect(page.getByRole("spinbutton", { name: "FiO2" })).toBeVisible();
  await expect(page.getByRole("spinbutton", { name: "PEEP" })).toHaveCount(0);
  await page.getByRole("button", { name: "FiO2, less" }).click();
  await page.getByRole("button", { name: "Save", exact: true }).click();
  await expect(page.getByText(/Saved/).first()).toBeVisible();
});

test("F6 a later change of tidal volume turns plateau and driving pressure to not measured since then", async ({
  page,
}) => {
  await signIn(page, "therapist");
  const patient = await patientIn(page, "7");
  await openRecord(page, patient);
  await page.getByRole("button", { name: "Tidal volume, less" }).click();
  await page.getByRole("button", { name: "Save", exact: true }).click();
  await expect(page.getByText(/Saved/).first()).toBeVisible();
  await page.goto(`/patients/${patient}`);
  const measured = page.getByRole("region", { name: "Measured" });
  await expect(measured).toContainText(/was 27 at \d\d:\d\d/);
  await expect(measured).toContainText(/not measured since \d\d:\d\d/);
  await expect(page.getByRole("region", { name: "Works out to" })).toContainText("needs plateau");
});

test("a wrong reading is voided with a reason, stays readable, and the screen returns to what stood before", async ({
  page,
}) => {
  await signIn(page, "therapist");
  const patient = await patientIn(page, "7");
  await openRecord(page, patient, "measurements");
  await page.getByRole("textbox", { name: "Plateau" }).click();
  await page.getByRole("button", { name: "3", exact: true }).click();
  await page.getByRole("button", { name: "3", exact: true }).click();
  await page.getByRole("button", { name: "relaxed", exact: true }).click();
  await page.getByRole("button", { name: "Save", exact: true }).click();
  await expect(page.getByText(/Saved/).first()).toBeVisible();
  await page.goto(`/patients/${patient}`);
  await expect(page.getByRole("region", { name: "Measured" })).toContainText("33");
  await page.getByRole("button", { name: /history of Plateau/ }).click();
  const history = page.getByRole("dialog", { name: "History of Plateau" });
  await history.getByRole("button", { name: "Void" }).first().click();
  await history.getByRole("button", { name: "Wrong reading" }).click();
  await history.getByRole("button", { name: "Void this entry" }).click();
  await expect(history.getByText(/Voided by M\. Okafor, RT at \d\d:\d\d: Wrong reading/)).toBeVisible();
  await expect(history.getByRole("deletion").first()).toContainText("Plateau 33");
  await history.getByRole("button", { name: "Close" }).click();
  await expect(page.getByRole("region", { name: "Measured" })).toContainText(/was 27 at/);
});

test("checked, unchanged is one tap", async ({ page }) => {
  await signIn(page, "therapist");
  await openRecord(page, await patientIn(page, "4"));
  await page.getByRole("button", { name: /Checked,\s*unchanged/ }).click();
  await expect(page.getByText(/Saved/).first()).toBeVisible();
});
