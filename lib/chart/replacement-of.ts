import type { Ctx } from "@/lib/access/context";
import type { PatientRow } from "@/lib/access/granted";
import {
  AppError,
  issuesOf,
  replacementSchemaOf,
  type Issue,
  type MechanicsValues,
  type SettingsValues,
} from "@/lib/contracts";
import type { Facts } from "@/lib/protocol";
import { chartedMoment, type ChartedMoment } from "./charted-moment";
import { modeIssues, pressureIssues, refuseIssues, settingsAfter } from "./judge-entry";
import { settingsValues } from "./newest-values";
import type { EntryRow } from "./queries/load-entries";
import { readCase, type Case } from "./read-case";
import { heightDetail } from "./record-height";
import type { MeasuredLength } from "./worked-out-height";

interface Replacement {
  moment: ChartedMoment;
  body: Record<string, unknown>;
}

const atEntry = (issues: readonly Issue[]): Issue[] =>
  issues.map(({ path, message }) => ({ path: path ? `entry.${path}` : "entry", message }));

function parsed({ kind }: EntryRow, entry: unknown): { chartedAt: string } & Record<string, unknown> {
  const result = replacementSchemaOf(kind).safeParse(entry);
  if (result.success) return result.data;
  throw new AppError("validation-failed", "Some values cannot be accepted.", {
    errors: atEntry(issuesOf(result.error)),
  });
}

/** What would be in force without the entry that is being replaced. */
function inForceWithout({ id }: EntryRow, facts: Facts, at: Date) {
  const settings = facts.settings?.filter((fact) => fact.id !== id);
  return settingsValues({ ...facts, settings }, at) ?? {};
}

function settingsIssuesOf(original: EntryRow, settings: SettingsValues, { facts, at }: Case): Issue[] {
  if (original.row?.mode && !settings.mode)
    return [{ path: "mode", message: "The entry it replaces carries a mode: so does its replacement, complete." }];
  return modeIssues(settings, inForceWithout(original, facts, at));
}

function bodyFor(original: EntryRow, values: Record<string, unknown>, moment: ChartedMoment, at: Case) {
  if (original.kind === "settings") refuseIssues(atEntry(settingsIssuesOf(original, values as SettingsValues, at)));
  if (original.kind === "mechanics") {
    const inForce = settingsValues(at.facts, at.at) ?? {};
    refuseIssues(atEntry(pressureIssues(values as MechanicsValues, settingsAfter(inForce))));
  }
  if (original.kind !== "heights") return values;
  return heightDetail(values as unknown as MeasuredLength, { birthDate: at.episode.birthDate, moment, path: "entry" });
}

/** What stands instead of an entry: that kind's whole body, judged by what was in force at its time. */
export async function replacementOf(
  ctx: Ctx,
  row: PatientRow,
  { original, entry, intubatedAt }: { original: EntryRow; entry: unknown; intubatedAt: Date },
): Promise<Replacement> {
  const { chartedAt, ...values } = parsed(original, entry);
  const limits = { now: ctx.now, intubatedAt, keeps: original.chartedAt, path: "entry.chartedAt" };
  const moment = chartedMoment(chartedAt, limits);
  const then = await readCase(ctx, row, { at: moment.chartedAt });
  return { moment, body: bodyFor(original, values, moment, then) };
}
