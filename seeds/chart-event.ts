import { chartBedsideEntry } from "@/lib/chart/chart-bedside-entry";
import { chartMechanics } from "@/lib/chart/chart-mechanics";
import { chartObservations } from "@/lib/chart/chart-observations";
import { chartSettingsCheck } from "@/lib/chart/chart-settings-check";
import { recordHeight } from "@/lib/chart/record-height";
import { voidSubmission } from "@/lib/chart/void-submission";
import type { BasedOn, ChartAnswer, SettingsValues } from "@/lib/contracts";
import { offsetIso } from "@/lib/format";
import type { Cast } from "./people";
import { actAs, newKey } from "./scribe";
import type { StoryEvent } from "./story";

/** One patient's story while it is told. */
export interface Teller {
  cast: Cast;
  patientId: string;
  timeZone: string;
  before: (hours: number) => Date;
  /** What was set so far: what the form would have shown. */
  settings: SettingsValues | null;
  /** Submissions that a later event may void, by their label. */
  submissions: Map<string, string>;
}

const MINUTE_MS = 60_000;

/** Pressures are charted with the settings under which they were measured. */
const shownWithMechanics = [
  "tidalVolumeMl",
  "pressureAbovePeepCmH2O",
  "pressureSupportCmH2O",
  "peepCmH2O",
  "mode",
] as const;

function basedOnOf({ settings }: Teller, event: StoryEvent): BasedOn {
  if (settings === null) return null;
  const touched = [...Object.keys(event.settings ?? {}), ...(event.mechanics ? shownWithMechanics : [])];
  return Object.fromEntries(touched.map((field) => [field, settings[field as keyof SettingsValues] ?? null]));
}

function actOf({ cast, patientId, timeZone, before }: Teller, { by, hoursAgo }: StoryEvent) {
  const charted = before(hoursAgo);
  return {
    asker: { actor: cast[by], now: new Date(charted.getTime() + MINUTE_MS), patientId },
    stamp: () => ({ clientKey: newKey(), chartedAt: offsetIso({ at: charted, timeZone }) }),
  };
}

function chartValues(teller: Teller, event: StoryEvent): Promise<ChartAnswer> | null {
  const { settings, mechanics, observations, reason } = event;
  const { asker, stamp } = actOf(teller, event);
  if (settings || (mechanics && observations)) {
    const basedOn = basedOnOf(teller, event);
    const body = { ...stamp(), basedOn, settings, mechanics, observations, reason };
    return actAs({ ...asker, right: "bedside-entries:chart", body }, (ctx, to) => chartBedsideEntry(ctx, to, body));
  }
  if (mechanics) {
    const body = { ...stamp(), ...mechanics };
    return actAs({ ...asker, right: "mechanics:chart", body }, (ctx, to) => chartMechanics(ctx, to, body));
  }
  if (!observations) return null;
  const body = { ...stamp(), ...observations };
  return actAs({ ...asker, right: "observations:chart", body }, (ctx, to) => chartObservations(ctx, to, body));
}

async function chartCheck(teller: Teller, event: StoryEvent): Promise<void> {
  const { asker, stamp } = actOf(teller, event);
  const body = { ...stamp(), basedOn: teller.settings };
  await actAs({ ...asker, right: "settings-checks:chart", body }, (ctx, to) => chartSettingsCheck(ctx, to, body));
}

async function chartHeight(teller: Teller, event: StoryEvent): Promise<void> {
  if (!event.height) return;
  const { asker, stamp } = actOf(teller, event);
  const body = { ...stamp(), ...event.height };
  await actAs({ ...asker, right: "heights:chart", body }, (ctx, to) => recordHeight(ctx, to, body));
}

async function voidEarlier(teller: Teller, event: StoryEvent, label: string): Promise<void> {
  const submissionId = teller.submissions.get(label);
  if (!submissionId) throw new Error(`nothing was charted as '${label}'`);
  const { asker } = actOf(teller, event);
  const body = { clientKey: newKey(), reason: event.reason ?? "Wrong reading" };
  await actAs({ ...asker, right: "entries:correct", body }, (ctx, to) =>
    voidSubmission(ctx, to, { submissionId, reason: body.reason }),
  );
}

/** Charts one event through the use cases that the routes call. */
export async function chartEvent(teller: Teller, event: StoryEvent): Promise<void> {
  const answer = await chartValues(teller, event);
  if (answer && event.label) teller.submissions.set(event.label, answer.submission.id);
  if (event.settings) teller.settings = { ...(event.settings.mode ? {} : teller.settings), ...event.settings };
  if (event.check) await chartCheck(teller, event);
  if (event.height) await chartHeight(teller, event);
  if (event.voids) await voidEarlier(teller, event, event.voids);
}
