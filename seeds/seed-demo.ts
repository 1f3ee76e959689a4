import { ChartEntry, Hospital } from "@/db/models";
import { hirePeople } from "./people";
import { buildUnits, setPolicies } from "./places";
import { stories } from "./stories";
import { admit, tell, type Stage } from "./tell-story";

const DAY_MS = 86_400_000;
const MINUTE_MS = 60_000;

/** The demo: one hospital with two units, its people, and three days of its patients that end at `now`. */
export async function seedDemo(now: Date): Promise<{ patients: number; entries: number }> {
  const hospital = await Hospital.create({ name: "Neaptide Demo Hospital" });
  const units = await buildUnits(hospital);
  const cast = await hirePeople(hospital, { harbour: units.harbour.id, east: units.east.id });
  await setPolicies(units, cast, new Date(now.getTime() - 30 * DAY_MS));
  // Bedside times are whole minutes.
  const stage: Stage = { now: new Date(Math.floor(now.getTime() / MINUTE_MS) * MINUTE_MS), cast, units };
  const tellers = [];
  for (const story of stories) tellers.push({ story, teller: await admit(stage, story) });
  await Promise.all(tellers.map(({ story, teller }) => tell(teller, story)));
  return { patients: stories.length, entries: await ChartEntry.count() };
}
