import type { HeightMethod } from "@/lib/contracts";

/** How a height was got, for beside the number: an estimate always says so. */
export const heightWords: Record<HeightMethod, { short: string; estimated: boolean }> = {
  "measured-standing": { short: "standing", estimated: false },
  "measured-lying": { short: "by tape", estimated: false },
  document: { short: "from a document", estimated: false },
  ulna: { short: "estimated by ulna", estimated: true },
  "knee-height": { short: "estimated by knee height", estimated: true },
  demispan: { short: "estimated by demispan", estimated: true },
  reported: { short: "reported", estimated: true },
};
