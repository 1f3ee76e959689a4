import { randomBytes } from "node:crypto";
import { mkdir, open, readFile, rename, rm } from "node:fs/promises";
import { join } from "node:path";

async function writeSecret(path) {
  const draft = `${path}.${process.pid}`;
  const file = await open(draft, "w", 0o600);
  try {
    await file.writeFile(randomBytes(32).toString("hex"));
    await file.sync();
  } finally {
    await file.close();
  }
  await rename(draft, path).catch((error) => rm(draft, { force: true }).then(() => Promise.reject(error)));
}

/** A random secret kept under that name in the data folder, readable by its owner alone; made at the first call. */
export async function secret(data, name) {
  const folder = join(data, "secrets");
  const path = join(folder, name);
  await mkdir(folder, { recursive: true, mode: 0o700 });
  const kept = () => readFile(path, "utf8");
  return kept().catch((error) => {
    if (error.code !== "ENOENT") throw error;
    return writeSecret(path).then(kept);
  });
}
