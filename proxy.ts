import { randomBytes } from "node:crypto";
import { NextResponse, type NextRequest } from "next/server";
import { isDevelopment } from "@/lib/env";
import { contentSecurityPolicy } from "@/lib/http/content-security-policy";
import { PATH_HEADER } from "@/lib/http/path-header";
import { securityHeaders } from "@/lib/http/security-headers";

/** Every page gets a policy with a nonce of its own; what may be read or done is decided by pages and handlers. */
export function proxy(request: NextRequest): NextResponse {
  const nonce = randomBytes(16).toString("base64");
  const policy = contentSecurityPolicy({ nonce, development: isDevelopment() });
  const headers = new Headers(request.headers);
  headers.set("x-nonce", nonce);
  headers.set(PATH_HEADER, request.nextUrl.pathname + request.nextUrl.search);
  // Next reads the nonce for its own scripts from the request's policy.
  headers.set("Content-Security-Policy", policy);
  const response = NextResponse.next({ request: { headers } });
  response.headers.set("Content-Security-Policy", policy);
  for (const [name, value] of securityHeaders) response.headers.set(name, value);
  return response;
}

export const config = {
  // Handlers under /api answer JSON and check for themselves; the build's files are the same for everyone.
  matcher: ["/((?!api/|_next/static|_next/image|fonts/|icons/|favicon.ico|sw.js|manifest.webmanifest).*)"],
};
