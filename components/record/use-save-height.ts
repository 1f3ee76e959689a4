"use client";

import { useState } from "react";
import { newClientKey } from "@/lib/client/new-client-key";
import { useChartEntry } from "@/lib/client/use-chart-entry";
import { offsetIso } from "@/lib/format";
import { heightBody, type HeightCheck, type HeightValues } from "./height-body";
import { refusalWords } from "./refusal-words";
import { useRecord } from "./use-record";

/** Charts a height for now, keeps trying, and says what stands in the way. */
export function useSaveHeight(onDone: () => void) {
  const { worksheet, clock } = useRecord();
  const chart = useChartEntry(worksheet.patient.id);
  const [said, setSaid] = useState(false);
  const save = (values: HeightValues, { lengthCm, blocker }: HeightCheck) => {
    const chartedAt = offsetIso({ at: clock(), timeZone: worksheet.unit.timeZone });
    const body = lengthCm === null ? null : heightBody(values, lengthCm, { chartedAt, clientKey: newClientKey() });
    if (blocker || !body) return setSaid(true);
    chart.mutate({ route: "heights", body }, { onSuccess: onDone });
  };
  return {
    save,
    said,
    sending: chart.isPending,
    tryNumber: chart.tryNumber,
    problem: chart.error ? refusalWords(chart.error) : null,
  };
}
