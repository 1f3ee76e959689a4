import type { Metadata } from "next";
import { ClinicalPage } from "@/components/shell/clinical-page";
import { WorksheetScreen } from "@/components/worksheet/worksheet-screen";
import { readMe } from "@/lib/access/read-me";
import { readWorksheet } from "@/lib/chart/read-worksheet";
import { pageRead } from "@/lib/http/page";

export const metadata: Metadata = { title: "Worksheet" };

export default async function WorksheetPage({ params }: { params: Promise<{ patientId: string }> }) {
  const { me, worksheet } = await pageRead({
    access: "patients:read",
    params: await params,
    read: async (ctx, granted) => ({ worksheet: await readWorksheet(ctx, granted, {}), me: await readMe(ctx) }),
  });
  return (
    <ClinicalPage me={me} here="worksheet" unit={worksheet.unit} now={worksheet.at} patientId={worksheet.patient.id}>
      <WorksheetScreen initial={worksheet} />
    </ClinicalPage>
  );
}
