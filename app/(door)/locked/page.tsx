import type { Metadata } from "next";
import { redirect } from "next/navigation";
import { UnlockForm } from "@/components/shell/unlock-form";
import { whoIsHere } from "@/lib/http/page";
import { sameOriginPath } from "@/lib/http/same-origin-path";

export const metadata: Metadata = { title: "Locked" };

interface LockedPageProps {
  searchParams: Promise<{ next?: string | string[] }>;
}

export default async function LockedPage({ searchParams }: LockedPageProps) {
  const { next } = await searchParams;
  const target = sameOriginPath(typeof next === "string" ? next : null, "/");
  const here = await whoIsHere();
  if (!here) redirect(`/sign-in?next=${encodeURIComponent(target)}`);
  if (!here.locked) redirect(target);
  return <UnlockForm name={here.actor.name} target={target} />;
}
