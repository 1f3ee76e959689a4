"use client";

import { useEffect, useState, type ReactNode } from "react";
import type { Me } from "@/lib/contracts";
import { PageFrame } from "./page-frame";

interface ClinicalPageProps {
  me: Me;
  here: "beds" | "worksheet";
  unit: { id: string; name: string; timeZone: string };
  /** The moment the page was made, ISO 8601. */
  now: string;
  /** The patient this page is about; the top bar leads back here. */
  patientId?: string;
  barOnPhone?: boolean;
  children: ReactNode;
}

/** A clinical screen in its frame: who is signed in, the unit's clock, and the way to the patient last seen. */
export function ClinicalPage({ me, here, unit, now, patientId, barOnPhone, children }: ClinicalPageProps) {
  const lastSeen = useLastSeenPatient(me.user.id, patientId);
  const bar = {
    here,
    unit,
    now,
    worksheetHref: lastSeen === null ? null : `/patients/${lastSeen}`,
    userName: me.user.name,
  };
  return (
    <PageFrame bar={bar} barOnPhone={barOnPhone}>
      {children}
    </PageFrame>
  );
}

/** Kept on this device by person: an id, no name. */
function useLastSeenPatient(userId: string, patientId: string | undefined): string | null {
  const key = `last-patient:${userId}`;
  const [lastSeen, setLastSeen] = useState<string | null>(patientId ?? null);
  useEffect(() => {
    if (patientId !== undefined) localStorage.setItem(key, patientId);
    else queueMicrotask(() => setLastSeen(localStorage.getItem(key)));
  }, [key, patientId]);
  return patientId ?? lastSeen;
}
