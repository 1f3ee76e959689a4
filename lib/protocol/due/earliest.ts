/** The earliest of some moments; null when there is none. */
export function earliest(...moments: (number | null)[]): number | null {
  const known = moments.filter((moment) => moment !== null);
  return known.length === 0 ? null : Math.min(...known);
}
