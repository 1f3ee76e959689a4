import { createHash } from "node:crypto";
import { readFile, readdir } from "node:fs/promises";
import { join } from "node:path";

const FOLDERS = ["app", "components", "db", "lib", "public"];
// Next reads these at build time, when they are there.
const FILES =
  /^(package(-lock)?\.json|tsconfig\.json|instrumentation(-client)?\.ts|proxy\.ts|.*\.config\.(js|cjs|mjs|ts)|\.env.*)$/;
const NOT_BUILT = /^(lib\/launch\/|.*\.md$|(eslint|vitest|playwright)\.config\.|\.env\.example$)/;

async function filesIn(root) {
  const nested = await Promise.all(
    FOLDERS.map(async (folder) => {
      const entries = await readdir(join(root, folder), { recursive: true, withFileTypes: true }).catch(() => []);
      return entries.filter((entry) => entry.isFile()).map((entry) => join(entry.parentPath ?? entry.path, entry.name));
    }),
  );
  const top = (await readdir(root)).filter((name) => FILES.test(name)).map((name) => join(root, name));
  const relative = [...nested.flat(), ...top].map((path) => path.slice(root.length + 1));
  return relative.filter((path) => !NOT_BUILT.test(path)).sort();
}

/** SHA-256 of all that decides what `next build` makes: sources, configuration, lock file and Node's version. */
export async function sourceHash(root) {
  const hash = createHash("sha256").update(process.version);
  for (const path of await filesIn(root)) {
    const content = await readFile(join(root, path));
    hash.update(`\0${path}\0${content.length}\0`).update(content);
  }
  return hash.digest("hex");
}
