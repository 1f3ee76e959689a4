import NextAuth from "next-auth";
import type { NextRequest } from "next/server";
import { authOptions, slowDownPrefix } from "@/lib/access/auth-options";
import { AppError } from "@/lib/contracts";

interface AuthContext {
  params: Promise<{ nextauth: string[] }>;
}

/** Where next-auth sends the person: in a Location, or as `url` for its own script. */
async function targetOf(response: Response): Promise<string | null> {
  const location = response.headers.get("location");
  if (location !== null || !response.headers.get("content-type")?.includes("json")) return location;
  const body: unknown = await response.clone().json();
  const url = (body as { url?: unknown } | null)?.url;
  return typeof url === "string" ? url : null;
}

function secondsToWait(target: string | null): string | null {
  const error = target && URL.canParse(target) ? new URL(target).searchParams.get("error") : null;
  return error?.startsWith(slowDownPrefix) ? error.slice(slowDownPrefix.length) : null;
}

/** The wait as everyone can read it: 429, Retry-After and a problem; `url` stays, because next-auth's script reads it. */
async function slowedDown(response: Response): Promise<Response> {
  const target = await targetOf(response);
  const seconds = secondsToWait(target);
  if (seconds === null) return response;
  const refusal = new AppError("slow-down", `Too many tries in a row. Wait ${seconds} s, then try again.`);
  const headers = { "Retry-After": seconds, "Content-Type": "application/problem+json", "Cache-Control": "no-store" };
  return Response.json({ ...refusal.toProblem(), url: target }, { status: refusal.status, headers });
}

/** next-auth's own addresses: its forms carry their own proof of origin, and sign-in is for anyone. */
export async function authRoute(request: NextRequest, context: AuthContext): Promise<Response> {
  const response: Response = await NextAuth(request, context, authOptions());
  return request.method === "POST" ? slowedDown(response) : response;
}
