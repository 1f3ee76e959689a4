import type { MechanicsValues, ObservationsValues } from "@/lib/contracts";
import type { PersonKey } from "../people";
import type { StoryEvent } from "../story";

interface Round {
  therapist: PersonKey;
  nurse: PersonKey;
  /** First and last round, in hours before now. */
  from: number;
  to: number;
  mechanics: MechanicsValues;
  observations: ObservationsValues;
}

/** More than a day back the story is told in wider steps and fewer entries: seeding stays short. */
const RECENT_HOURS = 24;
const EVERY_HOURS = 4;
const EVERY_HOURS_EARLIER = 8;

/** Small steps up and down, the same at every seeding: a chart of real readings is never flat. */
const sway = [0, 1, 0, -1, 1, 0, -1] as const;
const swayOf = (round: number, shift: number) => sway[(round + shift) % sway.length] ?? 0;

function moved<Values extends object>(values: Values, steps: Partial<Record<keyof Values, number>>): Values {
  const changed = Object.entries(steps).flatMap(([name, step]) => {
    const value = values[name as keyof Values];
    return typeof value === "number" ? [[name, value + (step as number)]] : [];
  });
  return { ...values, ...Object.fromEntries(changed) };
}

function roundAt(hoursAgo: number, round: number, { therapist, nurse, mechanics, observations }: Round): StoryEvent[] {
  const pressure = swayOf(round, 0);
  const reading = moved(mechanics, {
    plateauCmH2O: pressure,
    peakCmH2O: pressure + swayOf(round, 3),
    exhaledTidalVolumeMl: 4 * swayOf(round, 2),
    respiratoryRateTotal: Math.max(0, swayOf(round, 4)),
  });
  const seen = moved(observations, {
    spo2Percent: Math.max(0, swayOf(round, 1)),
    heartRate: 3 * swayOf(round, 5),
    systolicMmHg: 4 * swayOf(round, 6),
    mapMmHg: 2 * swayOf(round, 6),
  });
  if (hoursAgo > RECENT_HOURS) return [{ hoursAgo, by: therapist, mechanics: reading, observations: seen }];
  return [
    { hoursAgo, by: therapist, mechanics: reading, check: true },
    { hoursAgo: hoursAgo - 0.2, by: nurse, observations: seen },
    { hoursAgo: hoursAgo - EVERY_HOURS / 2, by: nurse, observations: moved(observations, { heartRate: -2 }) },
  ];
}

function timesOf({ from, to }: Round): number[] {
  const times: number[] = [];
  for (let hoursAgo = from; hoursAgo >= to; hoursAgo -= hoursAgo > RECENT_HOURS ? EVERY_HOURS_EARLIER : EVERY_HOURS) {
    times.push(hoursAgo);
  }
  return times;
}

/** The therapist measures and checks, the nurse notes what the monitor shows, then and in between; earlier in one. */
export function rounds(plan: Round): StoryEvent[] {
  return timesOf(plan).flatMap((hoursAgo, round) => roundAt(hoursAgo, round, plan));
}
