"use client";

import { TextField } from "@/components/ui/text-field";
import { useRecord } from "./use-record";

/** Why a hold was not possible: asked, since a missing plateau needs its cause. */
export function HoldReason() {
  const { values, set } = useRecord().editing;
  if (values.hold !== "not-possible") return null;
  return (
    <TextField
      label="Why was the hold not possible?"
      hint="Coughing, leak, no expiratory hold on this machine …"
      maxLength={200}
      value={values.holdReason}
      onChange={(event) => set("holdReason", event.target.value)}
      className="py-2"
    />
  );
}
