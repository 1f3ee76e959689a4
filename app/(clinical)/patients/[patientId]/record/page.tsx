import type { Metadata } from "next";
import { RecordScreen } from "@/components/record/record-screen";
import { ClinicalPage } from "@/components/shell/clinical-page";
import { readMe } from "@/lib/access/read-me";
import { readWorksheet } from "@/lib/chart/read-worksheet";
import { pageRead } from "@/lib/http/page";

export const metadata: Metadata = { title: "Record" };

interface RecordPageProps {
  params: Promise<{ patientId: string }>;
  searchParams: Promise<{ focus?: string | string[] }>;
}

export default async function RecordPage({ params, searchParams }: RecordPageProps) {
  const { focus } = await searchParams;
  const { me, worksheet } = await pageRead({
    access: "patients:read",
    params: await params,
    read: async (ctx, granted) => ({
      worksheet: await readWorksheet(ctx, granted, { facts: true }),
      me: await readMe(ctx),
    }),
  });
  const { unit, patient, at } = worksheet;
  return (
    <ClinicalPage me={me} here="worksheet" unit={unit} now={at} patientId={patient.id} barOnPhone={false}>
      <RecordScreen initial={worksheet} person={me.user} focus={typeof focus === "string" ? focus : null} />
    </ClinicalPage>
  );
}
