/**
 * Where to go after signing in: a path of ours, or the fallback. Anything that a browser could read as another host
 * (`//host`, `/\host`, a scheme, a control character it would skip) is not a path.
 *
 * @example sameOriginPath("/patients/7?at=1", "/beds") //=> "/patients/7?at=1"
 * @example sameOriginPath("//elsewhere.example", "/beds") //=> "/beds"
 */
export function sameOriginPath(asked: string | null | undefined, fallback: string): string {
  if (!asked?.startsWith("/") || /^\/[/\\]|[\p{Cc}\\]/u.test(asked)) return fallback;
  const base = "https://this.host";
  const url = URL.canParse(asked, base) ? new URL(asked, base) : null;
  return url?.origin === base ? `${url.pathname}${url.search}${url.hash}` : fallback;
}
