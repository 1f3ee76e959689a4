import { existsSync } from "node:fs";
import { capture } from "./processes.mjs";
import { Refusal } from "./refusal.mjs";

const APT = "/usr/bin/apt-get";
// Another apt may be at work on a fresh machine; wait for it.
const APT_OPTIONS = ["-y", "--no-install-recommends", "-o", "DPkg::Lock::Timeout=300", "-o", "Dpkg::Use-Pty=0"];

// Stopped half way, dpkg would have to be repaired by hand: it is let finish.
const apt = (...args) =>
  capture(APT, args, { env: { ...process.env, DEBIAN_FRONTEND: "noninteractive" }, finish: true });

/** Installs a Debian package as root; anyone else is told what to install. */
export async function installPackage(name, purpose) {
  const isRoot = process.getuid() === 0;
  if (!isRoot || !existsSync(APT)) {
    const how = existsSync(APT) ? `sudo apt-get install ${name}` : `install the package '${name}' of your system`;
    throw new Refusal(`${purpose} is missing. Install it, then run this again: ${how}.`);
  }
  console.log(`Installing Debian's ${name}.`);
  const update = await apt("update");
  const install = await apt("install", ...APT_OPTIONS, name);
  if (install.code === 0) return;
  throw new Refusal(`${update.stderr}${install.stdout}${install.stderr}\nDebian's ${name} could not be installed.`);
}
