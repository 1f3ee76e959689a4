import { existsSync } from "node:fs";
import { run } from "./processes.mjs";
import { Refusal } from "./refusal.mjs";

const APT = "/usr/bin/apt-get";
// Another apt may be at work on a fresh machine; wait for it.
const APT_OPTIONS = ["-y", "--no-install-recommends", "-o", "DPkg::Lock::Timeout=300"];

/** Installs a Debian package as root; anyone else is told what to install. */
export async function installPackage(name, purpose) {
  const isRoot = process.getuid() === 0;
  if (!isRoot || !existsSync(APT)) {
    const how = existsSync(APT) ? `sudo apt-get install ${name}` : `install the package '${name}' of your system`;
    throw new Refusal(`${purpose} is missing. Install it, then run this again: ${how}.`);
  }
  console.log(`Installing Debian's ${name}.`);
  const env = { ...process.env, DEBIAN_FRONTEND: "noninteractive" };
  const options = { env, stdio: ["ignore", "inherit", "inherit"] };
  await run(APT, ["update", "-qq"], options);
  const code = await run(APT, ["install", "-qq", ...APT_OPTIONS, name], options);
  if (code !== 0) throw new Refusal(`Debian's ${name} could not be installed; apt-get says why above.`);
}
