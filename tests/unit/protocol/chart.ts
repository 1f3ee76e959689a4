import {
  evaluate,
  targetsFromSet,
  type Derived,
  type DerivedName,
  type EpisodeFacts,
  type Evaluation,
  type Facts,
  type Finding,
  type StartingSetName,
  type Targets,
  type UnitPolicy,
} from "@/lib/protocol";

/** Invented charts for the rules' tests. A moment is written '14:20', or '2 03:10' on the second day. */
export function moment(clock: string): string {
  const [time, day = "1"] = clock.split(" ").reverse();
  return new Date(`2026-12-${day.padStart(2, "0")}T${time}:00Z`).toISOString();
}

export const author = { id: "7", name: "R. Therapist" };
let next = 100;

/** A charted fact. `recorded`: when it reached the record, else at once; `id`: else the next number. */
export function fact<Body extends object>(clock: string, body: Body, more: { recorded?: string; id?: string } = {}) {
  next += 1;
  return {
    id: more.id ?? String(next),
    chartedAt: moment(clock),
    recordedAt: moment(more.recorded ?? clock),
    author,
    ...body,
  };
}

export const volumeControl = {
  mode: "A/C-VC",
  tidalVolumeMl: 420,
  respiratoryRate: 20,
  peepCmH2O: 10,
  fio2: 0.5,
  inspiratoryTimeS: 0.9,
  flowLPerMin: 60,
} as const;

export const pressureControl = {
  mode: "A/C-PC",
  pressureAbovePeepCmH2O: 14,
  respiratoryRate: 20,
  peepCmH2O: 10,
  fio2: 0.5,
  inspiratoryTimeS: 0.9,
} as const;

export const settings = (clock: string, body: object) => fact(clock, body);
export const relaxed = (clock: string, plateauCmH2O: number, more: object = {}) =>
  fact(clock, { plateauCmH2O, hold: "relaxed" as const, ...more });
export const spo2 = (clock: string, spo2Percent: number) => fact(clock, { spo2Percent });
export const gas = (clock: string, body: object) => fact(clock, { specimen: "arterial" as const, ...body });

/** A man of 175 cm: PBW 70.566 kg (ARDS Network; 01-pbw-003). */
export const height = fact("07:00", {
  heightCm: 175,
  sexForPbw: "male" as const,
  method: "measured-lying" as const,
});

export interface Bedside {
  facts?: Facts;
  targets?: Partial<Targets>;
  set?: StartingSetName;
  unit?: UnitPolicy;
  episode?: Partial<EpisodeFacts>;
}

/** The core's answer at a moment: A/C-VC from 08:00 and a height unless the facts say otherwise; unit default. */
export function judge(
  at: string,
  { facts = {}, targets = {}, set = "unit-default", unit, episode }: Bedside = {},
): Evaluation {
  return evaluate({
    targets: { ...targetsFromSet(set, "order"), ...targets },
    unit: unit ?? { barometricPressureMmHg: 760 },
    episode: { intubatedAt: moment("07:30"), ...episode },
    facts: { settings: [settings("08:00", volumeControl)], heights: [height], ...facts },
    at: moment(at),
  });
}

export function metric(name: DerivedName, at: string, bedside?: Bedside): Derived {
  return judge(at, bedside).derived[name];
}

export function finding(name: DerivedName, answer: Evaluation): Finding {
  const found = answer.findings.find((one) => one.metric === name);
  if (!found) throw new Error(`no finding of ${name}`);
  return found;
}

export function dueAt(what: string, answer: Evaluation): string | null {
  return answer.due.find((one) => one.what === what)?.dueAt ?? null;
}
