/**
 * What stood on record at `$knownAt` (infinity: now) of the entries `e` that are joined with their detail rows: nothing
 * superseded by then. A void has no detail row, so the join leaves it out. `recorded_at` decides, so that what was known
 * at any past moment can be shown again.
 */
export const standing = `e.recorded_at <= $knownAt::timestamptz
  AND NOT EXISTS (SELECT FROM chart_entries s WHERE s.supersedes_id = e.id AND s.recorded_at <= $knownAt::timestamptz)`;

export const newestFirst = `ORDER BY e.charted_at DESC, e.recorded_at DESC, e.id DESC`;

/** The value of `$knownAt` when nothing but the present is asked for. */
export const everKnown = "infinity";
