import "@testing-library/jest-dom/vitest";
import { cleanup } from "@testing-library/react";
import { afterEach, beforeEach, expect, vi } from "vitest";

const unexpected: unknown[][] = [];

beforeEach(() => {
  unexpected.length = 0;
  vi.spyOn(console, "error").mockImplementation((...words) => void unexpected.push(words));
  vi.spyOn(console, "warn").mockImplementation((...words) => void unexpected.push(words));
});

afterEach(() => {
  cleanup();
  vi.restoreAllMocks();
  vi.unstubAllGlobals();
  vi.useRealTimers();
  expect(unexpected, "console.error and console.warn stay silent").toEqual([]);
});
