import { MARK } from "./child-environment.mjs";
import { askHolder, takeLock } from "./lock.mjs";
import { Refusal } from "./refusal.mjs";
import { dataFolder } from "./settings.mjs";
import { endProcesses, hasVariable, processesWhere } from "./system-processes.mjs";

const leftBehind = (data) => processesWhere((pid) => hasVariable(pid, MARK, data));

/**
 * Makes the data folder ours until the launcher ends, and ends what a killed launcher left running on it.
 * Answers the folder's real path. Throws Refusal when another launcher has it.
 */
export async function takeDataFolder(path, describe) {
  const data = await dataFolder(path);
  const lock = await takeLock(data, "data", () => describe);
  if (!lock) {
    const holder = await askHolder(data, "data");
    throw new Refusal(
      `${holder || "Another launcher"} already runs on ${data}. Stop it there (Ctrl-C), or set NEAPTIDE_DATA to another folder.`,
    );
  }
  await endProcesses(leftBehind(data), "SIGTERM", 5_000);
  return data;
}

/** The last step of an end: nothing that was started for this data folder outlives its launcher. */
export const endLeftBehind = (data) => endProcesses(leftBehind(data), "SIGTERM", 3_000);
