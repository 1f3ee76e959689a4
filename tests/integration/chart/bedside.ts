import { randomUUID } from "node:crypto";
import { POST as bedsideEntries } from "@/app/api/patients/[patientId]/bedside-entries/route";
import { POST as corrections } from "@/app/api/patients/[patientId]/entries/[entryId]/corrections/route";
import { GET as entries } from "@/app/api/patients/[patientId]/entries/route";
import { POST as heights } from "@/app/api/patients/[patientId]/heights/route";
import { POST as mechanics } from "@/app/api/patients/[patientId]/mechanics/route";
import { POST as observations } from "@/app/api/patients/[patientId]/observations/route";
import { POST as settingsChecks } from "@/app/api/patients/[patientId]/settings-checks/route";
import { POST as settings } from "@/app/api/patients/[patientId]/settings/route";
import { POST as voids } from "@/app/api/patients/[patientId]/submissions/[submissionId]/void/route";
import { GET as worksheet } from "@/app/api/patients/[patientId]/worksheet/route";
import type { ChartAnswer, Entry, FieldConflict, Worksheet } from "@/lib/contracts";
import { buildEpisode } from "../factories";
import { call, type Answered } from "../http/call";
import { signedInAs } from "../http/signed-in";
import { buildWard, type Ward } from "../http/ward";

const routes = {
  settings,
  "settings-checks": settingsChecks,
  mechanics,
  observations,
  heights,
  "bedside-entries": bedsideEntries,
};

export type ChartRoute = keyof typeof routes;
type Person = "therapist" | "intensivist" | "nurse";
type Body = Record<string, unknown>;

export const minutesAgo = (minutes: number) => new Date(Date.now() - minutes * 60_000).toISOString();

/** Complete for A/C-VC, inside the unit's default at the height below: 420 mL is 5.95 mL/kg. */
export const volumeControl = {
  mode: "A/C-VC",
  tidalVolumeMl: 420,
  respiratoryRate: 20,
  peepCmH2O: 10,
  fio2: 0.5,
  inspiratoryTimeS: 0.9,
};

export const pressureControl = {
  mode: "A/C-PC",
  pressureAbovePeepCmH2O: 14,
  respiratoryRate: 20,
  peepCmH2O: 10,
  fio2: 0.5,
  inspiratoryTimeS: 0.9,
};

/** PBW 70.566 kg (ARDS Network 2000). */
export const tallMan = { method: "measured-lying", sexForPbw: "male", heightCm: 175 };

/** The values in force that a form filled with these settings showed. */
export const shown = (values: Body, ...fields: string[]) =>
  Object.fromEntries(fields.map((field) => [field, values[field] ?? null]));

/** What a bedside entry with mechanics says it measured on, beside what it changes. */
export const measuredOn = (values: Body) =>
  shown(values, "tidalVolumeMl", "pressureAbovePeepCmH2O", "pressureSupportCmH2O", "peepCmH2O", "mode");

/** One patient, the people of the unit, and the routes as their pages would call them. */
export class Bedside {
  private constructor(
    readonly ward: Ward,
    readonly patientId: string,
    readonly episodeId: string,
    private readonly cookies: Record<Person, string>,
  ) {}

  static async open({ hoursIntubated = 40, policy = {} as { nursesSetVentilators?: boolean } } = {}): Promise<Bedside> {
    const ward = await buildWard(policy);
    const intubatedAt = new Date(Date.now() - hoursIntubated * 3_600_000);
    const { patientId, id } = await buildEpisode({ unitId: ward.unit.id, intubatedAt });
    const { therapist, intensivist, nurse } = ward.people;
    const cookies = {
      therapist: await signedInAs(therapist),
      intensivist: await signedInAs(intensivist),
      nurse: await signedInAs(nurse),
    };
    return new Bedside(ward, patientId, id, cookies);
  }

  cookie(as: Person = "therapist"): string {
    return this.cookies[as];
  }

  chart(kind: ChartRoute, body: Body, { as = "therapist" }: { as?: Person } = {}): Promise<Answered> {
    return call(routes[kind], {
      cookie: this.cookies[as],
      path: `/api/patients/${this.patientId}/${kind}`,
      params: { patientId: this.patientId },
      body: { clientKey: randomUUID(), chartedAt: minutesAgo(0), ...body },
    });
  }

  /** Charts what must succeed: a test's own beginning. */
  async charted(kind: ChartRoute, body: Body, options: { as?: Person } = {}): Promise<ChartAnswer> {
    const answer = await this.chart(kind, body, options);
    if (answer.status !== 201) throw new Error(`${kind} answered ${answer.status}: ${JSON.stringify(answer.json)}`);
    return answer.json as unknown as ChartAnswer;
  }

  /** First settings an hour ago and a height: what most tests start from. */
  async settled(values: Body = volumeControl, minutes = 60): Promise<ChartAnswer> {
    await this.charted("heights", { ...tallMan, chartedAt: minutesAgo(minutes) });
    return this.charted("settings", { ...values, basedOn: null, chartedAt: minutesAgo(minutes) });
  }

  correct(entryId: string, body: Body, { as = "therapist" }: { as?: Person } = {}): Promise<Answered> {
    return call(corrections, {
      cookie: this.cookies[as],
      path: `/api/patients/${this.patientId}/entries/${entryId}/corrections`,
      params: { patientId: this.patientId, entryId },
      body: { clientKey: randomUUID(), reason: "Wrong reading", ...body },
    });
  }

  undo(submissionId: string, body: Body = {}, { as = "therapist" }: { as?: Person } = {}): Promise<Answered> {
    return call(voids, {
      cookie: this.cookies[as],
      path: `/api/patients/${this.patientId}/submissions/${submissionId}/void`,
      params: { patientId: this.patientId, submissionId },
      body: { clientKey: randomUUID(), reason: "Wrong patient", ...body },
    });
  }

  private read(handler: typeof worksheet, name: string, query: Record<string, string>, as: Person) {
    const path = `/api/patients/${this.patientId}/${name}?${new URLSearchParams(query)}`;
    return call(handler, { cookie: this.cookies[as], path, params: { patientId: this.patientId } });
  }

  async worksheet(query: Record<string, string> = {}, as: Person = "therapist"): Promise<Worksheet> {
    const { status, json } = await this.read(worksheet, "worksheet", query, as);
    if (status !== 200) throw new Error(`worksheet answered ${status}: ${JSON.stringify(json)}`);
    return json as unknown as Worksheet;
  }

  async history(query: Record<string, string> = {}): Promise<{ entries: Entry[]; next: string | null }> {
    const { status, json } = await this.read(entries, "entries", query, "therapist");
    if (status !== 200) throw new Error(`entries answered ${status}: ${JSON.stringify(json)}`);
    return json as unknown as { entries: Entry[]; next: string | null };
  }
}

export const conflictOf = ({ json }: Answered) => json.conflict as FieldConflict[] | undefined;

/** The entry of a kind that an answer filed; its first one where no kind is named. */
export function idOf({ entries }: ChartAnswer, kind?: string): string {
  const entry = entries.find((filed) => kind === undefined || filed.kind === kind);
  if (!entry) throw new Error(`the answer filed no ${kind ?? "entry"}`);
  return entry.id;
}
