import type { FactBase, Instant } from "../facts";
import { isoOf, millisecondsOf } from "../instant";

/** A fact with its `chartedAt` as milliseconds. */
export interface Item<Fact extends FactBase = FactBase> {
  t: number;
  fact: Fact;
  /** `recordedAt` as milliseconds, once asked for; 0 before. */
  recorded: number;
}

/** When the fact was recorded, milliseconds. */
export function recordedAt(item: Item): number {
  if (item.recorded === 0) item.recorded = millisecondsOf(item.fact.recordedAt);
  return item.recorded;
}

/** '2026-12-01T12:00:00.000Z': what is already so written need not be written again. */
const isUtc = (instant: Instant): instant is string =>
  typeof instant === "string" && instant.length === 24 && instant.endsWith("Z");

/** `chartedAt` and `recordedAt` as ISO 8601 in UTC. */
export function writtenTimes(item: Item): { chartedAt: string; recordedAt: string } {
  const { fact, t } = item;
  return {
    chartedAt: isUtc(fact.chartedAt) ? fact.chartedAt : isoOf(t)!,
    recordedAt: isUtc(fact.recordedAt) ? fact.recordedAt : isoOf(recordedAt(item))!,
  };
}

const recordedOf = (fact: FactBase) => millisecondsOf(fact.place?.recordedAt ?? fact.recordedAt);

/** Ids are numbers written as text, or any text in a test. */
function compareIds(a: string, b: string): number {
  const difference = Number(a) - Number(b);
  if (!Number.isNaN(difference) && difference !== 0) return difference;
  return a < b ? -1 : a > b ? 1 : 0;
}

/** V1: order of facts: (chartedAt, recordedAt, id), a replacement in its original's place. */
function compareItems(a: Item, b: Item): number {
  if (a.t !== b.t) return a.t - b.t;
  const recorded = recordedOf(a.fact) - recordedOf(b.fact);
  if (recorded !== 0) return recorded;
  return compareIds(a.fact.place?.id ?? a.fact.id, b.fact.place?.id ?? b.fact.id);
}

/** Facts ascending; those already in order are not sorted again. */
export function itemsInOrder<Fact extends FactBase>(facts: readonly Fact[] | null | undefined): Item<Fact>[] {
  const items = (facts ?? []).map((fact) => ({ t: millisecondsOf(fact.chartedAt), fact, recorded: 0 }));
  const inOrder = items.every((item, index) => index === 0 || compareItems(items[index - 1]!, item) <= 0);
  return inOrder ? items : items.sort(compareItems);
}

/** How many of an ascending list stand at or before a moment, by binary search. */
export function countUntil(items: readonly { t: number }[], t: number): number {
  let low = 0;
  let high = items.length;
  while (low < high) {
    const middle = (low + high) >> 1;
    if (items[middle]!.t <= t) low = middle + 1;
    else high = middle;
  }
  return low;
}

/** The newest of an ascending list at or before a moment. */
export function newestUntil<T extends { t: number }>(items: readonly T[], t: number): T | null {
  return items[countUntil(items, t) - 1] ?? null;
}
