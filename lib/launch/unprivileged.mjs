import { spawnSync } from "node:child_process";
import { lstatSync, readFileSync, statSync } from "node:fs";
import { lchown, readdir } from "node:fs/promises";
import { join } from "node:path";
import { Refusal } from "./refusal.mjs";

const USER_NAMESPACE = ["unshare", "--user", "--map-user=1000", "--map-group=1000", "--"];

const succeeds = ([command, ...args]) => spawnSync(command, args, { cwd: "/", stdio: "ignore" }).status === 0;

/** The user that Debian's PostgreSQL package makes, else nobody. */
function serverAccount() {
  const line = readFileSync("/etc/passwd", "utf8")
    .split("\n")
    .find((entry) => entry.startsWith("postgres:"));
  const [, , uid, gid] = line?.split(":") ?? [];
  return { uid: Number(uid ?? 65534), gid: Number(gid ?? 65534) };
}

// A folder under root's own (mode 700) is out of that user's reach without a capability to search folders.
const CAPABILITIES = [[], ["dac_read_search"], ["dac_override"]];

function withCapability({ uid, gid }, capability) {
  const grants = capability.flatMap((name) => ["--inh-caps", `+${name}`, "--ambient-caps", `+${name}`]);
  return ["setpriv", "--reuid", String(uid), "--regid", String(gid), "--clear-groups", ...grants, "--"];
}

async function giveTo(path, { uid, gid }) {
  await lchown(path, uid, gid);
  if (!lstatSync(path).isDirectory()) return;
  for (const name of await readdir(path)) await giveTo(join(path, name), { uid, gid });
}

async function ensureOwner(folder, account) {
  if (statSync(folder).uid === account.uid) return;
  await giveTo(folder, account);
}

async function byAccount(folder) {
  const account = serverAccount();
  await ensureOwner(folder, account);
  const prefixes = CAPABILITIES.map((capability) => withCapability(account, capability));
  // `test -w` would not do: access(2) looks away from capabilities.
  const prefix = prefixes.find((words) => succeeds([...words, "stat", join(folder, ".")]));
  if (!prefix) {
    throw new Refusal(
      `PostgreSQL does not run as root, and no other user of this system can reach ${folder}. Set NEAPTIDE_DATA to a folder outside of root's own, or run as another user.`,
    );
  }
  return prefix;
}

/**
 * Words to put before a PostgreSQL command so that it does not run as root, which it refuses. A user namespace needs
 * no second account and no change of ownership; where the system forbids one, the command runs as Debian's account.
 */
export async function unprivileged(folder, { namespaces = succeeds([...USER_NAMESPACE, "true"]) } = {}) {
  if (process.getuid() !== 0) return [];
  if (!namespaces) return byAccount(folder);
  await ensureOwner(folder, { uid: 0, gid: 0 });
  return USER_NAMESPACE;
}
