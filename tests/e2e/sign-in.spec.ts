import { expect, people, signIn, test } from "./people";

test("one tap on a demo person fills the form, and signing in leads to the beds", async ({ page }) => {
  await page.goto("/");
  await expect(page).toHaveURL(/\/sign-in/);
  await page.getByRole("button", { name: /Respiratory therapist/ }).click();
  await expect(page.getByLabel("E-mail")).toHaveValue(people.therapist);
  await page.getByRole("button", { name: "Sign in", exact: true }).click();
  await expect(page).toHaveURL(/\/beds/);
  await expect(page.getByRole("heading", { name: "Harbour ICU" })).toBeVisible();
  await expect(page.getByText("Supports, does not replace, judgement.")).toBeVisible();
});

test("a wrong password is told in the same words as an unknown address, and the address stays typed", async ({
  page,
}) => {
  await page.goto("/sign-in");
  const words: (string | null)[] = [];
  for (const email of [people.nurse, "nobody@neaptide.test"]) {
    await page.getByLabel("E-mail").fill(email);
    await page.getByLabel("Password").fill("not the password");
    await page.getByRole("button", { name: "Sign in", exact: true }).click();
    const alert = page.getByRole("alert").filter({ hasText: /./ }).first();
    await expect(alert).toBeVisible();
    words.push(await alert.textContent());
    await expect(page.getByLabel("E-mail")).toHaveValue(email);
  }
  expect(words[0]).toBe(words[1]);
});

test("signing out ends the session on the server", async ({ page }) => {
  await signIn(page, "nurse");
  await page.goto("/beds");
  await page.getByRole("button", { name: /T\. Marsh/ }).click();
  await page.getByRole("menuitem", { name: "Sign out" }).click();
  await expect(page).toHaveURL(/\/sign-in/);
  expect((await page.request.get("/api/me")).status()).toBe(401);
});

test("an administrator sees no patients, and the beds of another unit are not found", async ({ page }) => {
  await signIn(page, "administrator");
  await page.goto("/beds");
  await expect(page.getByText(/as an administrator you see no patients/)).toBeVisible();
  await page.context().clearCookies();
  await signIn(page, "nurseEast");
  await page.goto("/beds");
  await expect(page.getByRole("heading", { name: "East ICU" })).toBeVisible();
  const answer = await page.goto("/patients/1");
  expect(answer?.status()).toBe(404);
  await expect(page.getByRole("heading", { name: "Not found" })).toBeVisible();
});
