/** A moment: a Date, ISO 8601 with offset, or milliseconds since 1970. */
export type Instant = Date | string | number;

/** Milliseconds since 1970. @throws RangeError for what is no moment */
export function millisecondsOf(instant: Instant): number {
  const milliseconds = new Date(instant).getTime();
  if (Number.isNaN(milliseconds)) throw new RangeError(`not a time: ${String(instant)}`);
  return milliseconds;
}
