import { admitPatient } from "@/lib/chart/admit-patient";
import { offsetIso } from "@/lib/format";
import { chartEvent, type Teller } from "./chart-event";
import type { Cast } from "./people";
import type { BuiltUnits } from "./places";
import { actAs, newKey } from "./scribe";
import type { Story } from "./story";

export interface Stage {
  /** When the stories end. */
  now: Date;
  cast: Cast;
  units: BuiltUnits;
}

/** Admits the story's patient, in the past; the events are told afterwards. */
export async function admit({ now, cast, units }: Stage, story: Story): Promise<Teller> {
  const { unit, bed, patient, admittedBy, admittedHoursAgo, intubatedHoursAgo } = story;
  const { id: unitId, timeZone, bedIds } = units[unit];
  const before = (hours: number) => new Date(now.getTime() - Math.round(hours * 60) * 60_000);
  const body = {
    clientKey: newKey(),
    ...patient,
    unitId,
    bedId: bedIds.get(bed) ?? "",
    intubatedAt: offsetIso({ at: before(intubatedHoursAgo), timeZone }),
  };
  const act = { actor: cast[admittedBy], now: before(admittedHoursAgo), right: "patients:admit", body } as const;
  const { patient: admitted } = await actAs(act, (ctx, granted) => admitPatient(ctx, granted, body));
  return { cast, patientId: admitted.id, timeZone, before, settings: null, submissions: new Map() };
}

/** Charts what happened, oldest first, each event a minute after it was true. */
export async function tell(teller: Teller, { events }: Story): Promise<void> {
  for (const event of [...events].sort((a, b) => b.hoursAgo - a.hoursAgo)) await chartEvent(teller, event);
}
