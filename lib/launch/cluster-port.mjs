import { readFile } from "node:fs/promises";
import { freePort, isFree } from "./ports.mjs";
import { Refusal } from "./refusal.mjs";

/** The port asked for, else the one of the last time when nobody has it now, else any free one. */
export async function choosePort(wanted, rememberedIn) {
  if (wanted) {
    if (await isFree(wanted)) return wanted;
    throw new Refusal(`Port ${wanted} (NEAPTIDE_PG_PORT) is taken. Choose another, or unset it to take a free one.`);
  }
  const remembered = Number(await readFile(rememberedIn, "utf8").catch(() => ""));
  if (remembered && (await isFree(remembered))) return remembered;
  return freePort();
}
