import { Skeleton } from "@/components/ui/skeleton";

export default function BedsLoading() {
  return <Skeleton label="Loading beds" rows={8} rowClass="h-[64px]" />;
}
