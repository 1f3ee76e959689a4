interface Policy {
  nonce: string;
  /** Next's development server evaluates code and opens a socket for hot reloading. */
  development: boolean;
}

/** Scripts and styles only by the request's nonce, everything else only from our own origin, framed by nobody. */
export function contentSecurityPolicy({ nonce, development }: Policy): string {
  const directives = [
    "default-src 'self'",
    `script-src 'self' 'nonce-${nonce}' 'strict-dynamic'${development ? " 'unsafe-eval'" : ""}`,
    development ? "style-src 'self' 'unsafe-inline'" : `style-src 'self' 'nonce-${nonce}'`,
    "img-src 'self' data: blob:",
    "font-src 'self'",
    `connect-src 'self'${development ? " ws:" : ""}`,
    "object-src 'none'",
    "base-uri 'self'",
    "form-action 'self'",
    "frame-ancestors 'none'",
  ];
  return directives.join("; ");
}
