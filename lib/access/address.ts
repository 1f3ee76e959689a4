/**
 * The address a request came from: the last one in X-Forwarded-For, which the nearest proxy (or Next's own server)
 * wrote; what stands before it is whatever the sender liked to say.
 */
export function addressOf(forwardedFor: unknown): string {
  const last = typeof forwardedFor === "string" ? forwardedFor.split(",").at(-1)?.trim() : "";
  return last || "unknown";
}
