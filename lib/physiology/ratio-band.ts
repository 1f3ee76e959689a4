import { isAbove } from "./same-number";

export type SeverityBand = "none" | "mild" | "moderate" | "severe";

/** Upper bounds of the bands, each belonging to its band. */
export interface BandEdges {
  severe: number;
  moderate: number;
  mild: number;
}

/** The band of a ratio; a ratio within float noise of an edge is on it. */
export function ratioBand(ratio: number, edges: BandEdges): SeverityBand {
  if (!isAbove(ratio, edges.severe)) return "severe";
  if (!isAbove(ratio, edges.moderate)) return "moderate";
  return isAbove(ratio, edges.mild) ? "none" : "mild";
}
