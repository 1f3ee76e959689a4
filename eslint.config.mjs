import { defineConfig, globalIgnores } from "eslint/config";
import nextVitals from "eslint-config-next/core-web-vitals";
import nextTs from "eslint-config-next/typescript";
import prettier from "eslint-config-prettier";

const environmentOnlyInEnv = {
  selector: "MemberExpression[object.name='process'][property.name='env']",
  message: "The environment is parsed once, in lib/env.ts.",
};

export default defineConfig([
  ...nextVitals,
  ...nextTs,
  prettier,
  globalIgnores([".next/**", ".data/**", "node_modules/**", "next-env.d.ts", "coverage/**", "playwright-report/**"]),
  {
    files: ["app/**", "components/**", "lib/**", "db/**", "seeds/**"],
    ignores: ["lib/env.ts", "lib/launch/**"],
    rules: { "no-restricted-syntax": ["error", environmentOnlyInEnv] },
  },
  {
    rules: {
      "@typescript-eslint/no-explicit-any": "error",
      "@typescript-eslint/no-unused-vars": ["error", { argsIgnorePattern: "^_", varsIgnorePattern: "^_" }],
    },
  },
]);
