"use client";

import { useState } from "react";
import type { Worksheet } from "@/lib/contracts";

export interface BedWatch {
  /** Bed at opening, or as last accepted. */
  bedId: string | null;
  /** The patient has moved since. */
  moved: { from: string | null; to: string | null } | null;
  accept: () => void;
  /** A kept draft began in this bed. */
  startFrom: (bedId: string | null) => void;
}

/** A draft belongs to the patient's stay, never to a bed: a move while the form is open is said before saving. */
export function useBedWatch({ episode }: Worksheet): BedWatch {
  const [bed, setBed] = useState(episode.bed);
  const moved = bed?.id === episode.bed?.id ? null : { from: bed?.label || null, to: episode.bed?.label ?? null };
  return {
    bedId: bed?.id ?? null,
    moved,
    accept: () => setBed(episode.bed),
    startFrom: (bedId) => {
      if (bedId !== (episode.bed?.id ?? null)) setBed(bedId === null ? null : { id: bedId, label: "" });
    },
  };
}
