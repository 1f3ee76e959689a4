"use client";

import type { CorrectionBody } from "@/lib/contracts";
import { useChartMutation } from "./use-chart-mutation";

/** Replaces or voids one entry, with a reason. The old one stays readable, struck through. */
export function useCorrectEntry(patientId: string) {
  return useChartMutation<{ entryId: string; body: CorrectionBody }>(
    ({ entryId }) => `/api/patients/${patientId}/entries/${entryId}/corrections`,
  );
}
