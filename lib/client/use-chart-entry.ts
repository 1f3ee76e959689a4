"use client";

import type { BedsideEntryBody, HeightBody, SettingsCheckBody } from "@/lib/contracts";
import { useChartMutation } from "./use-chart-mutation";

/** What can be charted from a form so far, by route. */
export type ChartedEntry =
  | { route: "bedside-entries"; body: BedsideEntryBody }
  | { route: "settings-checks"; body: SettingsCheckBody }
  | { route: "heights"; body: HeightBody };

/** Charts an entry for a patient; `tryNumber` counts the tries of one that no answer has come to. */
export function useChartEntry(patientId: string) {
  return useChartMutation<ChartedEntry>(({ route }) => `/api/patients/${patientId}/${route}`);
}
