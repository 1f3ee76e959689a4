/** What a browser reads as another host, or skips over: a second slash, a backslash, a control character. */
const otherHost = /^\/\/|[\p{Cc}\\]/u;

/**
 * Where to go after signing in: a path of ours, or the fallback.
 *
 * @example sameOriginPath("/patients/7?at=1", "/beds") //=> "/patients/7?at=1"
 * @example sameOriginPath("//elsewhere.example", "/beds") //=> "/beds"
 */
export function sameOriginPath(asked: string | null | undefined, fallback: string): string {
  const base = "https://this.host";
  if (!asked?.startsWith("/") || otherHost.test(asked) || !URL.canParse(asked, base)) return fallback;
  const { origin, pathname, search, hash } = new URL(asked, base);
  // Dots are folded by now: `/../..//host` has become `//host`.
  return origin === base && !otherHost.test(pathname) ? pathname + search + hash : fallback;
}
