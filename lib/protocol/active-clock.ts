import type { EpisodeFacts } from "./targets";
import { millisecondsOf } from "./instant";

interface Away {
  from: number;
  until: number;
}

/** F3: time that counts: a pause, while the patient is away, stops all clocks. Moments are milliseconds. */
export interface ActiveClock {
  /** Time between two moments without the pauses. */
  between(from: number, to: number): number;
  /** The moment at which so much counted time has passed; null while a pause has no end. */
  after(from: number, duration: number): number | null;
  /** The end of the newest pause over at a moment. */
  returnedAt(at: number): number | null;
  isAway(at: number): boolean;
  /** Starts and ends of pauses. */
  edges: number[];
}

function pausesOf(episode: EpisodeFacts | null | undefined): Away[] {
  const pauses = (episode?.pauses ?? []).map(({ from, until }) => ({
    from: millisecondsOf(from),
    until: until === null || until === undefined ? Infinity : millisecondsOf(until),
  }));
  return pauses.filter(({ from, until }) => until > from).sort((a, b) => a.from - b.from);
}

function after(pauses: readonly Away[], from: number, duration: number): number | null {
  let moment = from;
  let left = duration;
  for (const pause of pauses) {
    if (pause.until <= moment) continue;
    const free = Math.max(0, pause.from - moment);
    if (left <= free) break;
    left -= free;
    moment = pause.until;
  }
  return Number.isFinite(moment) ? moment + left : null;
}

function between(pauses: readonly Away[], from: number, to: number): number {
  const away = pauses.map((pause) => Math.max(0, Math.min(to, pause.until) - Math.max(from, pause.from)));
  return to - from - away.reduce((sum, part) => sum + part, 0);
}

/** The clock of an episode. Pauses are taken as not overlapping. */
export function activeClockOf(episode: EpisodeFacts | null | undefined): ActiveClock {
  const pauses = pausesOf(episode);
  const ended = (at: number) => pauses.filter(({ until }) => until <= at).map(({ until }) => until);
  return {
    between: (from, to) => (pauses.length === 0 ? to - from : between(pauses, from, to)),
    after: (from, duration) => (pauses.length === 0 ? from + duration : after(pauses, from, duration)),
    returnedAt: (at) => ended(at).at(-1) ?? null,
    isAway: (at) => pauses.some(({ from, until }) => from <= at && at < until),
    edges: pauses.flatMap(({ from, until }) => [from, until]).filter(Number.isFinite),
  };
}
