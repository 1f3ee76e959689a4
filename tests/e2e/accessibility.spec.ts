import AxeBuilder from "@axe-core/playwright";
import type { Page } from "@playwright/test";
import { expect, patientIn, signIn, test } from "./people";

const sizes = [
  { width: 1440, height: 900 },
  { width: 1024, height: 768 },
  { width: 390, height: 844 },
  { width: 320, height: 640 },
];

/** What a pinned bar covers until one scrolls reads as too small a target: those are measured on a page without overlap. */
async function expectClean(page: Page, where: string) {
  const axe = new AxeBuilder({ page }).withTags(["wcag2a", "wcag2aa", "wcag21a", "wcag21aa", "wcag22aa"]);
  const { violations } = await axe.disableRules(["target-size"]).analyze();
  const said = violations.map(({ id, nodes }) => `${id}: ${nodes.map(({ target }) => target.join(" ")).join(", ")}`);
  expect(said, where).toEqual([]);
  const overflow = await page.evaluate(() => document.documentElement.scrollWidth - window.innerWidth);
  expect(overflow, `${where}: no sideways scrolling`).toBeLessThanOrEqual(0);
}

async function expectTargets(page: Page, where: string, width: number) {
  await page.setViewportSize({ width, height: 3000 });
  const { violations } = await new AxeBuilder({ page }).withRules(["target-size"]).analyze();
  expect(
    violations.flatMap(({ nodes }) => nodes.map(({ target }) => target.join(" "))),
    where,
  ).toEqual([]);
}

for (const theme of ["day", "night"]) {
  test(`axe finds nothing in the ${theme} theme at any width`, async ({ page }) => {
    test.setTimeout(240_000);
    await page.addInitScript((chosen) => localStorage.setItem("theme", chosen), theme);
    await page.goto("/sign-in");
    for (const size of sizes) {
      await page.setViewportSize(size);
      await expectClean(page, `sign-in ${theme} ${size.width}`);
    }
    await signIn(page, "therapist");
    const paths = ["/beds"];
    for (const bed of ["3", "10", "1"]) paths.push(`/patients/${await patientIn(page, bed)}`);
    paths.push(`/patients/${await patientIn(page, "2")}/record`);
    for (const path of paths) {
      await page.goto(path);
      await expect(page.getByRole("contentinfo")).toBeAttached();
      for (const size of sizes) {
        await page.setViewportSize(size);
        await expectClean(page, `${path} ${theme} ${size.width}`);
        await expectTargets(page, `targets of ${path} at ${size.width}`, size.width);
      }
    }
  });
}

test("every screen can be worked by keyboard: from the beds to a saved change", async ({ page }) => {
  await signIn(page, "therapist");
  await page.goto("/beds");
  const bed = page.getByRole("link", { name: /Bed 4/ });
  await bed.focus();
  await page.keyboard.press("Enter");
  await expect(page.getByRole("heading", { name: /Helen Brandt/ })).toBeVisible();
  await page.getByRole("link", { name: "Enter settings" }).first().focus();
  await page.keyboard.press("Enter");
  const rate = page.getByRole("spinbutton", { name: "Rate" });
  await rate.focus();
  await page.keyboard.press("ArrowUp");
  const save = page.getByRole("button", { name: "Save", exact: true });
  await save.focus();
  await page.keyboard.press("Enter");
  await expect(page.getByText(/Saved/).first()).toBeVisible();
});
