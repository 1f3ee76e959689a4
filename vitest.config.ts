import react from "@vitejs/plugin-react";
import { fileURLToPath } from "node:url";
import { defineConfig } from "vitest/config";

const root = fileURLToPath(new URL("./", import.meta.url));

const alias = [{ find: /^@\//, replacement: root }];

export default defineConfig({
  resolve: { alias },
  test: {
    // Two cores run several suites at once: a slow moment is no failure.
    testTimeout: 20_000,
    projects: [
      {
        extends: true,
        test: { name: "reference", environment: "node", include: ["tests/reference/**/*.test.ts"] },
      },
      {
        extends: true,
        test: { name: "unit", environment: "node", include: ["tests/unit/**/*.test.ts"] },
      },
      {
        extends: true,
        plugins: [react()],
        test: {
          name: "component",
          environment: "jsdom",
          include: ["tests/component/**/*.test.tsx"],
          setupFiles: ["tests/component/setup.ts"],
        },
      },
      {
        extends: true,
        test: {
          name: "integration",
          environment: "node",
          include: ["tests/integration/**/*.test.ts"],
          setupFiles: ["tests/integration/setup.ts"],
          pool: "forks",
          testTimeout: 30_000,
          hookTimeout: 60_000,
        },
      },
      {
        extends: true,
        test: {
          name: "faults",
          environment: "node",
          include: ["tests/faults/**/*.test.ts"],
          // Each starts the whole application; two at once only make both slow.
          fileParallelism: false,
          testTimeout: 180_000,
          hookTimeout: 120_000,
        },
      },
    ],
  },
});
