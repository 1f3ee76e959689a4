"use client";

import type { SubmissionVoidBody } from "@/lib/contracts";
import { useChartMutation } from "./use-chart-mutation";

/** Voids all that one save charted: what Undo files. */
export function useVoidSubmission(patientId: string) {
  return useChartMutation<{ submissionId: string; body: SubmissionVoidBody }>(
    ({ submissionId }) => `/api/patients/${patientId}/submissions/${submissionId}/void`,
  );
}
