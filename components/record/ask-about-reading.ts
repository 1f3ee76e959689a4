import { fieldsOfMode } from "@/lib/physiology";
import type { Ask } from "./ask";
import { draftedMechanics } from "./drafted-measurements";
import { shownMode, shownNumber } from "./drafted-settings";
import type { Filled } from "./filled";
import type { RecordValues } from "./record-values";

/** Exhaled above this share of the set volume may be two breaths on top of one another. Common practice. */
const stackedAbove = 1.3;

/** The question whose answer is charted as breath stacking, instead of only being let through. */
export const stackedKey = "stacked";

type Reading = NonNullable<ReturnType<typeof draftedMechanics>>;

function stackedAsk(reading: Reading, setVolume: number | null): Ask | null {
  const { exhaledTidalVolumeMl: exhaled, breathStacking } = reading;
  if (exhaled === undefined || setVolume === null || breathStacking !== undefined) return null;
  if (exhaled <= stackedAbove * setVolume + 1e-6) return null;
  return {
    key: stackedKey,
    question: `Exhaled ${exhaled} mL is over 1.3 times the set ${setVolume} mL: stacked breaths?`,
    yes: "Yes, stacked",
    no: "No",
  };
}

function trappedGasAsk({ totalPeepCmH2O: total }: Reading, setPeep: number | null): Ask | null {
  if (total === undefined || setPeep === null || total >= setPeep - 1e-6 || setPeep - total > 2 + 1e-6) return null;
  return {
    key: `trapped=${total}/${setPeep}`,
    question: `Total PEEP ${total} is below the set PEEP ${setPeep}: trapped gas 0?`,
    yes: `Yes, total PEEP ${total}`,
  };
}

function abovePeakAsk({ plateauCmH2O: plateau, peakCmH2O: peak }: Reading): Ask | null {
  if (plateau === undefined || peak === undefined || plateau <= peak + 1e-6 || plateau - peak > 2 + 1e-6) return null;
  return {
    key: `abovePeak=${plateau}/${peak}`,
    question: `Plateau ${plateau} is above peak ${peak}.`,
    yes: `Yes, ${plateau} and ${peak}`,
  };
}

/** Readings that contradict one another by little: asked here, refused where it is more. */
export function readingAsks(values: RecordValues, filled: Filled): Ask[] {
  const reading = draftedMechanics(values);
  const mode = shownMode(values, filled);
  if (!reading || !mode) return [];
  const used = fieldsOfMode(mode);
  const setOf = (field: "tidalVolumeMl" | "peepCmH2O") => (used.has(field) ? shownNumber(values, filled, field) : null);
  const asks = [
    stackedAsk(reading, setOf("tidalVolumeMl")),
    trappedGasAsk(reading, setOf("peepCmH2O")),
    abovePeakAsk(reading),
  ];
  return asks.filter((ask) => ask !== null);
}
