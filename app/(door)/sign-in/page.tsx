import type { Metadata } from "next";
import { redirect } from "next/navigation";
import { SignInForm } from "@/components/shell/sign-in-form";
import { demoPassword, demoPeople } from "@/lib/access/demo-people";
import { env } from "@/lib/env";
import { whoIsHere } from "@/lib/http/page";
import { sameOriginPath } from "@/lib/http/same-origin-path";

export const metadata: Metadata = { title: "Sign in" };

interface SignInPageProps {
  searchParams: Promise<{ next?: string | string[] }>;
}

export default async function SignInPage({ searchParams }: SignInPageProps) {
  const { next } = await searchParams;
  const target = sameOriginPath(typeof next === "string" ? next : null, "/");
  const here = await whoIsHere();
  if (here && !here.locked) redirect(target);
  const demo = env().NEAPTIDE_MODE === "production" ? undefined : { people: demoPeople, password: demoPassword };
  return <SignInForm target={target} demo={demo} />;
}
