import { readdirSync } from "node:fs";
import { join, resolve } from "node:path";

const apiFolder = resolve(import.meta.dirname, "../../../app/api");
const methods = ["GET", "HEAD", "POST", "PUT", "PATCH", "DELETE", "OPTIONS"] as const;

export type Handler = (request: Request, context: { params: Promise<Record<string, string>> }) => Promise<Response>;

/** `[patientId]` and `[...nextauth]` become `:patientId` and `:nextauth`. */
function addressOf(file: string): string {
  const folders = file.split("/").slice(0, -1);
  return ["/api", ...folders.map((folder) => folder.replace(/^\[(?:\.\.\.)?(\w+)\]$/, ":$1"))].join("/");
}

/** Every handler that the file system holds, by `METHOD /address`. */
export async function findHandlers(): Promise<Map<string, Handler>> {
  const files = readdirSync(apiFolder, { recursive: true, encoding: "utf8" }).filter((file) =>
    /(^|\/)route\.[jt]sx?$/.test(file),
  );
  const found = new Map<string, Handler>();
  for (const file of files) {
    const exported = (await import(join(apiFolder, file))) as Partial<Record<string, Handler>>;
    for (const method of methods) {
      const handler = exported[method];
      if (handler) found.set(`${method} ${addressOf(file)}`, handler);
    }
  }
  return found;
}
