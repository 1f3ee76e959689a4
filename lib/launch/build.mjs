import { existsSync } from "node:fs";
import { readFile, rm, writeFile } from "node:fs/promises";
import { join } from "node:path";
import { refuseWhileBuildUsed, withCheckoutLock } from "./checkout.mjs";
import { childEnvironment } from "./child-environment.mjs";
import { capture } from "./processes.mjs";
import { Refusal } from "./refusal.mjs";
import { sourceHash } from "./source-hash.mjs";

const stampOf = (root) => join(root, ".next", "built-from");

async function isFresh(root, hash) {
  const built = await readFile(stampOf(root), "utf8").catch(() => "");
  return built === hash && existsSync(join(root, ".next", "BUILD_ID"));
}

async function build(root, data, hash) {
  console.log("Building.");
  await rm(stampOf(root), { force: true });
  const args = [join(root, "node_modules", "next", "dist", "bin", "next"), "build"];
  // No address of a database is given: a build that needs one is a fault.
  const env = childEnvironment(data);
  const { code, stdout, stderr } = await capture(process.execPath, args, { cwd: root, env });
  if (code !== 0) throw new Refusal(`${stdout}${stderr}\nThe application could not be built; the reason stands above.`);
  await writeFile(stampOf(root), hash);
}

/** Builds the application when its sources are not those of the last build. */
export async function ensureBuilt(root, data) {
  if (await isFresh(root, await sourceHash(root))) return;
  await withCheckoutLock(root, async () => {
    const hash = await sourceHash(root);
    if (await isFresh(root, hash)) return;
    refuseWhileBuildUsed(root);
    await build(root, data, hash);
  });
}
