import type { Metadata } from "next";
import { redirect } from "next/navigation";
import { BedsScreen } from "@/components/beds/beds-screen";
import { ClinicalPage } from "@/components/shell/clinical-page";
import { readMe } from "@/lib/access/read-me";
import { readBeds } from "@/lib/chart/read-beds";
import { pageRead } from "@/lib/http/page";

export const metadata: Metadata = { title: "Beds" };

export default async function BedsPage({ searchParams }: { searchParams: Promise<{ unit?: string }> }) {
  const me = await pageRead({ access: "session:own", read: (ctx) => readMe(ctx) });
  const unitId = (await searchParams).unit ?? me.units.find(({ role }) => role !== null)?.id;
  if (unitId === undefined) redirect("/no-unit");
  const beds = await pageRead({
    access: "beds:read",
    params: { unitId },
    read: (ctx, granted) => readBeds(ctx, granted),
  });
  return (
    <ClinicalPage me={me} here="beds" unit={beds.unit} now={beds.at}>
      <BedsScreen key={unitId} initial={beds} />
    </ClinicalPage>
  );
}
