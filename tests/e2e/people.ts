import { expect, test as base, type Page } from "@playwright/test";

export const people = {
  therapist: "therapist@neaptide.test",
  intensivist: "intensivist@neaptide.test",
  nurse: "nurse@neaptide.test",
  nurseEast: "nurse.east@neaptide.test",
  administrator: "admin@neaptide.test",
} as const;

export type Person = keyof typeof people;

const password = "small-tides-2026";

/** A browser that errs at nothing: an unexpected console error, warning or thrown error fails the test. */
export const test = base.extend<{ page: Page }>({
  page: async ({ page }, run) => {
    const unexpected: string[] = [];
    page.on("console", (message) => {
      if (message.type() !== "error" && message.type() !== "warning") return;
      // The browser itself reports every refused request; the tests of refusals look at their words instead.
      if (
        /the server responded with a status of (401|403|404|409|422|429)|ERR_INTERNET_DISCONNECTED/.test(message.text())
      )
        return;
      unexpected.push(message.text());
    });
    page.on("pageerror", (error) => unexpected.push(String(error)));
    await run(page);
    expect(unexpected, "the console stays silent").toEqual([]);
  },
});

export { expect };

/** Signs in as a demo person over the same endpoint as the form, which has a test of its own. */
export async function signIn(page: Page, who: Person): Promise<void> {
  const { csrfToken } = (await (await page.request.get("/api/auth/csrf")).json()) as { csrfToken: string };
  const answer = await page.request.post("/api/auth/callback/credentials", {
    form: { csrfToken, email: people[who], password, json: "true" },
    headers: { origin: new URL(page.url() === "about:blank" ? "/" : page.url(), process.env.BASE_URL).origin },
  });
  expect(answer.ok()).toBe(true);
}

/** The id of the patient in a bed of one's own unit. */
export async function patientIn(page: Page, bed: string): Promise<string> {
  const me = (await (await page.request.get("/api/me")).json()) as {
    units: { beds: { label: string; patientId: string | null }[] }[];
  };
  const found = me.units.flatMap(({ beds }) => beds).find(({ label }) => label === bed)?.patientId;
  if (!found) throw new Error(`no patient in bed ${bed}`);
  return found;
}

/** Sends JSON as the page's own scripts would, from the same origin. */
export async function post(page: Page, path: string, data: unknown) {
  const base = process.env.BASE_URL ?? "";
  return page.request.post(path, { data, headers: { origin: new URL(base).origin } });
}

/** Opens a patient's record form and waits until it answers: a touch before that would be the browser's alone. */
export async function openRecord(page: Page, patient: string, focus = ""): Promise<void> {
  await page.goto(`/patients/${patient}/record${focus && `?focus=${focus}`}`);
  await expect(page.locator("[data-record-foot]")).toBeVisible();
  await page.waitForLoadState("networkidle");
}
