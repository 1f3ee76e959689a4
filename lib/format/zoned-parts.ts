import { millisecondsOf, type Instant } from "./instant";

const formatters = new Map<string, Intl.DateTimeFormat>();

function formatterOf(timeZone: string): Intl.DateTimeFormat {
  const known = formatters.get(timeZone);
  if (known) return known;
  const made = new Intl.DateTimeFormat("en-US", {
    timeZone,
    hourCycle: "h23",
    weekday: "short",
    day: "numeric",
    month: "short",
    year: "numeric",
    hour: "2-digit",
    minute: "2-digit",
  });
  formatters.set(timeZone, made);
  return made;
}

type Part = "weekday" | "day" | "month" | "year" | "hour" | "minute";

/** Wall clock and calendar of a moment in an IANA zone, whatever the device's own zone. @throws RangeError unknown zone */
export function zonedParts({ at, timeZone }: { at: Instant; timeZone: string }): Record<Part, string> {
  const parts = formatterOf(timeZone).formatToParts(millisecondsOf(at));
  const valueOf = (type: Part) => parts.find((part) => part.type === type)?.value ?? "";
  return {
    weekday: valueOf("weekday"),
    day: valueOf("day"),
    month: valueOf("month"),
    year: valueOf("year"),
    hour: valueOf("hour"),
    minute: valueOf("minute"),
  };
}
