import { Skeleton } from "@/components/ui/skeleton";

export default function PatientLoading() {
  return <Skeleton label="Loading the patient" rows={9} rowClass="h-[51px]" />;
}
