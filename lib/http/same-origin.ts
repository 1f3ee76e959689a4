import { AppError } from "@/lib/contracts";
import { env } from "@/lib/env";

/** In production the proxy in front may rewrite Host, so the address people type decides; elsewhere the Host they used. */
function ownHost(request: Request): string | null {
  const { NEAPTIDE_MODE, NEXTAUTH_URL } = env();
  return NEAPTIDE_MODE === "production" ? new URL(NEXTAUTH_URL).host : request.headers.get("host");
}

function hostOf(origin: string): string | null {
  return URL.canParse(origin) ? new URL(origin).host : null;
}

export function changesState(request: Request): boolean {
  return request.method !== "GET" && request.method !== "HEAD";
}

/** A state-changing call comes from our own pages: another site's form carries the cookie too, but not this Origin. */
export function refuseForeignOrigin(request: Request): void {
  const origin = request.headers.get("origin");
  const host = origin === null ? null : hostOf(origin);
  if (host !== null && host === ownHost(request)) return;
  throw new AppError("forbidden", "This call did not come from a page of this server: its Origin must be this host.");
}
