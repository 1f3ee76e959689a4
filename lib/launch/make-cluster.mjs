import { mkdir, rename, rm, writeFile } from "node:fs/promises";
import { join } from "node:path";
import { postgresEnvironment } from "./postgres-environment.mjs";
import { capture } from "./processes.mjs";
import { Refusal } from "./refusal.mjs";
import { unprivileged } from "./unprivileged.mjs";

export const SUPERUSER = "postgres";

/** Makes an empty cluster whose superuser has that password. */
export async function makeCluster({ folder, programs, password }) {
  const draft = `${folder}.new`;
  await rm(draft, { recursive: true, force: true });
  await mkdir(join(draft, "data"), { recursive: true, mode: 0o700 });
  await writeFile(join(draft, "password"), password, { mode: 0o600 });
  const [command, ...args] = [...(await unprivileged(draft)), join(programs, "initdb")];
  const settings = ["--auth=scram-sha-256", "--encoding=UTF8", "--locale=C.UTF-8", `--username=${SUPERUSER}`];
  const { code, stdout, stderr } = await capture(
    command,
    [...args, "-D", join(draft, "data"), ...settings, `--pwfile=${join(draft, "password")}`],
    { cwd: "/", env: postgresEnvironment() },
  );
  if (code !== 0) throw new Refusal(`PostgreSQL could not make its cluster in ${folder}:\n${stdout}${stderr}`);
  // Renamed when complete, so that an interrupted first start leaves no half cluster.
  await rename(join(draft, "data"), folder);
  await rm(draft, { recursive: true, force: true });
}
