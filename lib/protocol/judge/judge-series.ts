import { foresee, freshnessOf, isFresh, tooSoonAfter, type Ageing, type Freshness } from "../freshness";
import type { NoteCode } from "../note-codes";
import type { State } from "../result";
import type { Scene } from "../scene";
import { recordedAt } from "../timeline/item";
import { missing, type Excursion, type Judged, type Named, type OutsideRun } from "./judged";
import type { Reading } from "./reading";

/** A reading's state against the order; null when it says nothing (V8). `harmful`: believed though too soon (F5). */
export interface Verdict {
  state: State | null;
  harmful?: boolean;
  notes?: NoteCode[];
}

/** A metric as a series of readings, ascending; only what is needed is read, from the newest back. */
export interface Series {
  named: Named;
  limit: Judged["limit"];
  /** How many readings stand at or before the moment. */
  count: number;
  read(index: number): Reading;
  ageing: Ageing;
  /** When the next reading is due. */
  dueAt(newest: Reading, lastOutside: boolean): number | null;
  firstDueAt?: number | null;
  /** `now`: judge a stale reading by the FiO2 in force now (S5). */
  verdict?(reading: Reading, now: boolean): Verdict;
}

const saysNothing: Verdict = { state: null };

function verdictOf(series: Series, reading: Reading, now: boolean): Verdict {
  return series.verdict && series.limit && reading.value !== null ? series.verdict(reading, now) : saysNothing;
}

/** F5, V8, V14: could this reading be judged, or shown where nothing is ordered, when it was taken? */
function couldBeJudged(scene: Scene, series: Series, reading: Reading): boolean {
  const verdict = verdictOf(series, reading, false);
  const saysSomething = series.limit ? verdict.state !== null : reading.value !== null && !reading.effort;
  return saysSomething && (verdict.harmful === true || !tooSoonAfter(scene, series.ageing, reading.t));
}

interface Found {
  index: number;
  reading: Reading;
}

function lastJudged(scene: Scene, series: Series, newest: Reading): Found | null {
  for (let index = series.count - 1; index >= 0; index--) {
    const reading = index === series.count - 1 ? newest : series.read(index);
    if (couldBeJudged(scene, series, reading)) return { index, reading };
  }
  return null;
}

const recordedOf = (reading: Reading) => recordedAt(reading.item);

/** S6, F9: how long it has been outside: back over outside readings, skipping withheld ones. */
function outsideRun(scene: Scene, series: Series, { index, reading: last }: Found): OutsideRun {
  const run = { since: last.t, recordedFrom: recordedOf(last) };
  for (let earlier = index - 1; earlier >= 0; earlier--) {
    const reading = series.read(earlier);
    if (!couldBeJudged(scene, series, reading)) continue;
    if (verdictOf(series, reading, false).state !== "outside") break;
    run.since = reading.t;
    run.recordedFrom = Math.min(run.recordedFrom, recordedOf(reading));
  }
  return run;
}

/** A2: readings judged outside after a moment, oldest first. */
function excursionsAfter(scene: Scene, series: Series, after: number): Excursion[] {
  const found: Excursion[] = [];
  let startsNext = true;
  for (let index = 0; index < series.count; index++) {
    const reading = series.read(index);
    if (!couldBeJudged(scene, series, reading)) continue;
    const { t, value } = reading;
    const outside = verdictOf(series, reading, false).state === "outside";
    if (outside && t > after) found.push({ t, recordedAt: recordedOf(reading), value: value!, starts: startsNext });
    startsNext = !outside;
  }
  return found;
}

/** F1: a newest reading that lacks an input is `missing`, whatever its age. */
function freshnessOfNewest(scene: Scene, series: Series, newest: Reading, dueAt: number | null): Freshness {
  const freshness = freshnessOf(scene, series.ageing, newest.t, dueAt);
  return newest.value === null && !newest.effort ? { word: "missing", change: freshness.change } : freshness;
}

function withheld(newest: Reading, freshness: Freshness): Judged["alternatives"] {
  const value = newest.value ?? newest.seen ?? null;
  const soon = freshness.word === "too-soon";
  if (value === null || !(newest.effort || soon)) return [];
  return [{ value, item: newest.item, note: newest.effort ? "patient-effort" : "too-soon" }];
}

/** F1–F9, S1, S6: the newest reading, what of it may be read now, and what was last known. */
export function judgeSeries(scene: Scene, series: Series): Judged {
  const { firstDueAt = null } = series;
  if (series.count === 0) {
    foresee(scene, firstDueAt);
    return missing(series.named, series.limit, scene.comfort ? null : firstDueAt);
  }
  const newest = series.read(series.count - 1);
  const found = lastJudged(scene, series, newest);
  const staleState = found && verdictOf(series, found.reading, true).state;
  const dueAt = scene.comfort ? null : series.dueAt(newest, staleState === "outside");
  foresee(scene, dueAt);
  const freshness = freshnessOfNewest(scene, series, newest, dueAt);
  const readable = found?.reading === newest && (isFresh(freshness.word) || freshness.word === "too-soon");
  const verdict = readable ? verdictOf(series, newest, false) : saysNothing;
  const lastState = readable ? verdict.state : staleState;
  const soon: NoteCode[] = freshness.word === "too-soon" ? ["too-soon"] : [];
  return {
    ...missing(series.named, series.limit, dueAt),
    ...(readable ? { state: verdict.state, reading: newest } : {}),
    freshness: freshness.word,
    change: freshness.change,
    last: found?.reading ?? null,
    lastState,
    run: found && lastState === "outside" ? outsideRun(scene, series, found) : null,
    notes: [...(newest.notes ?? []), ...(verdict.notes ?? []), ...soon],
    alternatives: [...(readable ? [] : withheld(newest, freshness)), ...(newest.alternatives ?? [])],
    excursionsAfter: (t) => excursionsAfter(scene, series, t),
  };
}
