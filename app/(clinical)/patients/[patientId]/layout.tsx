import type { ReactNode } from "react";
import { pageRead } from "@/lib/http/page";

interface PatientLayoutProps {
  params: Promise<{ patientId: string }>;
  children: ReactNode;
}

/** Asks for the right before anything is sent: once the skeleton has gone out, a 404 could no longer be said. */
export default async function PatientLayout({ params, children }: PatientLayoutProps) {
  const { patientId } = await params;
  await pageRead({ access: "patients:read", params: { patientId }, read: async () => null });
  return children;
}
