import { existsSync } from "node:fs";
import { readFile } from "node:fs/promises";
import { join } from "node:path";
import { childEnvironment } from "./child-environment.mjs";
import { refuseWhilePackagesUsed, withCheckoutLock } from "./checkout.mjs";
import { run } from "./processes.mjs";
import { Refusal } from "./refusal.mjs";

async function packagesIn(path) {
  const text = await readFile(path, "utf8").catch(() => undefined);
  return text === undefined ? undefined : JSON.parse(text).packages;
}

function isInstalled(folder, path, wanted, found) {
  if (!found) return Boolean(wanted.optional);
  return found.version === wanted.version && found.integrity === wanted.integrity && existsSync(join(folder, path));
}

/** Whether node_modules holds what the lock file says. npm writes what it installed to node_modules/.package-lock.json. */
export async function installMatchesLock(folder) {
  const wanted = await packagesIn(join(folder, "package-lock.json"));
  const found = await packagesIn(join(folder, "node_modules", ".package-lock.json"));
  if (!wanted || !found) return false;
  const paths = Object.keys(wanted).filter((path) => path !== "");
  const strangers = Object.keys(found).filter((path) => !(path in wanted));
  return strangers.length === 0 && paths.every((path) => isInstalled(folder, path, wanted[path], found[path]));
}

// The npm that started us is the one to use; without one, the PATH's.
function npm() {
  const script = process.env.npm_execpath;
  return script?.endsWith(".js") && existsSync(script) ? [process.execPath, script] : ["npm"];
}

/** Installs the packages of the lock file when node_modules does not match it. */
export async function ensureInstalled(folder, data) {
  if (await installMatchesLock(folder)) return;
  await withCheckoutLock(folder, async () => {
    if (await installMatchesLock(folder)) return;
    refuseWhilePackagesUsed(folder);
    console.log("Installing packages.");
    const [command, ...args] = [...npm(), "ci", "--include=dev", "--no-audit", "--no-fund", "--loglevel=error"];
    const code = await run(command, args, {
      cwd: folder,
      env: childEnvironment(data),
      stdio: ["ignore", "inherit", "inherit"],
    });
    if (code !== 0) throw new Refusal("The packages could not be installed; npm says why above.");
  });
}
