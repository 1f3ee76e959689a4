/**
 * What stood on record at `$knownAt` (infinity: now) of the entries `e`: no void, and nothing superseded by then.
 * Both are decided by `recorded_at`, so that what was known at any past moment can be shown again.
 */
export const standing = `e.correction IS DISTINCT FROM 'void' AND e.recorded_at <= $knownAt::timestamptz
  AND NOT EXISTS (SELECT FROM chart_entries s WHERE s.supersedes_id = e.id AND s.recorded_at <= $knownAt::timestamptz)`;

export const newestFirst = `ORDER BY e.charted_at DESC, e.recorded_at DESC, e.id DESC`;

/** The value of `$knownAt` when nothing but the present is asked for. */
export const everKnown = "infinity";
