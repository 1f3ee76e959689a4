import { createHash } from "node:crypto";

function sorted(value: unknown): unknown {
  if (Array.isArray(value)) return value.map(sorted);
  if (typeof value !== "object" || value === null) return value;
  return Object.fromEntries(
    Object.entries(value)
      .sort(([a], [b]) => (a < b ? -1 : 1))
      .map(([name, inner]) => [name, sorted(inner)]),
  );
}

/**
 * What makes two requests with one key the same request: method, path with its ids, and the JSON as sent, keys sorted.
 *
 * @example bodyHash("POST", "/api/patients/7/settings", { b: 1, a: 2 }) === bodyHash("POST", "/api/patients/7/settings", { a: 2, b: 1 })
 */
export function bodyHash(method: string, path: string, json: unknown): string {
  const text = [method, path, JSON.stringify(sorted(json))].join("\n");
  return createHash("sha256").update(text).digest("hex");
}
