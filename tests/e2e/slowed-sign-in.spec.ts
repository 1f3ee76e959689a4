import { randomUUID } from "node:crypto";
import type { APIResponse, Page } from "@playwright/test";
import { expect, test } from "./people";

/** next-auth's own form, as its script sends it. */
async function attempt(page: Page, email: string): Promise<APIResponse> {
  const { csrfToken } = (await (await page.request.get("/api/auth/csrf")).json()) as { csrfToken: string };
  return page.request.post("/api/auth/callback/credentials", {
    form: { csrfToken, email, password: "not the password", json: "true" },
  });
}

test("the fourth wrong password in a row is answered 429 with Retry-After, and the form counts the wait down", async ({
  page,
}) => {
  const email = `${randomUUID()}@neaptide.test`;
  const statuses: number[] = [];
  for (let n = 0; n < 3; n += 1) statuses.push((await attempt(page, email)).status());
  expect(statuses).toEqual([401, 401, 401]);
  const slowed = await attempt(page, email);
  expect(slowed.status()).toBe(429);
  expect(slowed.headers()["retry-after"]).toBe("1");
  expect(await slowed.json()).toMatchObject({ type: "/problems/slow-down", status: 429 });

  await page.waitForTimeout(1000);
  expect((await attempt(page, email)).headers()["retry-after"]).toBe("2");
  await page.goto("/sign-in");
  await page.getByLabel("E-mail").fill(email);
  await page.getByLabel("Password").fill("not the password");
  await page.getByRole("button", { name: "Sign in", exact: true }).click();
  await expect(page.getByRole("button", { name: /^Wait \d+ s$/ })).toBeDisabled();
  await expect(page.getByLabel("Password")).toHaveValue("not the password");
  await expect(page.getByRole("button", { name: "Sign in", exact: true })).toBeEnabled();
});

test("the cookie names a session and nobody, and scripts cannot read it", async ({ page }) => {
  await page.goto("/sign-in");
  await page.getByRole("button", { name: /Respiratory therapist/ }).click();
  await page.getByRole("button", { name: "Sign in", exact: true }).click();
  await expect(page).toHaveURL(/\/beds/);
  const cookies = await page.context().cookies();
  const session = cookies.find(({ name }) => name.endsWith("next-auth.session-token"));
  expect(session).toMatchObject({ httpOnly: true, sameSite: "Lax" });
  expect(Object.keys((await (await page.request.get("/api/auth/session")).json()) as object)).toEqual(["expires"]);
});

test("every page carries a policy with a nonce of its own", async ({ page }) => {
  const policies = [await page.goto("/sign-in"), await page.goto("/sign-in")].map(
    (answer) => answer?.headers()["content-security-policy"] ?? "",
  );
  for (const policy of policies) expect(policy).toMatch(/script-src 'self' 'nonce-[\w+/=]{20,}' 'strict-dynamic'/);
  expect(policies[0]).not.toBe(policies[1]);
});

test("after signing in a foreign address in 'next' is not followed", async ({ page }) => {
  await page.goto("/sign-in?next=%2F%2Felsewhere.example%2Fbeds");
  await page.getByRole("button", { name: /Respiratory therapist/ }).click();
  await page.getByRole("button", { name: "Sign in", exact: true }).click();
  await expect(page).toHaveURL(/\/beds/);
});
