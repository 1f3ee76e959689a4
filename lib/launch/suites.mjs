import { Refusal } from "./refusal.mjs";

/** Suites that vitest runs side by side; each is a project of vitest.config.ts and a folder of tests/. */
export const VITEST_SUITES = ["reference", "unit", "component", "integration"];

/** All suites, in the order they run. */
export const SUITES = [...VITEST_SUITES, "e2e", "faults"];

/** `npm test -- unit e2e tests/e2e/x.spec.ts`: names of suites (all without one), and paths that narrow them. */
export function chooseSuites(args) {
  const paths = args.filter((word) => word.startsWith("tests/"));
  const names = args.filter((word) => !word.startsWith("tests/"));
  const unknown = names.filter((name) => !SUITES.includes(name));
  if (unknown.length > 0)
    throw new Refusal(`No suite is called ${unknown.join(", ")}. There are: ${SUITES.join(", ")}.`);
  const chosen = (name) => names.length === 0 || names.includes(name);
  return { suites: SUITES.filter(chosen), paths };
}
