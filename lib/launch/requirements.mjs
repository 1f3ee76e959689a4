import { Refusal } from "./refusal.mjs";

const OLDEST_NODE = [20, 9];

/** Throws Refusal where the launcher cannot work. */
export function requireSystem(version = process.versions.node, platform = process.platform) {
  const [major = 0, minor = 0] = version.split(".").map(Number);
  const [oldestMajor, oldestMinor] = OLDEST_NODE;
  if (major < oldestMajor || (major === oldestMajor && minor < oldestMinor)) {
    throw new Refusal(`Node ${OLDEST_NODE.join(".")} or newer is needed; this is ${version}.`);
  }
  if (platform !== "linux") throw new Refusal(`This runs on Linux, best on Debian; this system is ${platform}.`);
}
