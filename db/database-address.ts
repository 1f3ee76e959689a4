export interface DatabaseAddress {
  host: string;
  port: string;
  database: string;
  username: string;
  password: string;
  /** Encrypted, with the server's certificate checked, unless the address says `sslmode=disable` or nothing. */
  encrypted: boolean;
}

/** Takes a `postgres://` address apart; each part may be percent-encoded. */
export function databaseAddress(url: string): DatabaseAddress {
  const { hostname, port, pathname, username, password, searchParams } = new URL(url);
  return {
    host: hostname.replace(/^\[(.*)\]$/, "$1"),
    port: port || "5432",
    database: decodeURIComponent(pathname.slice(1)),
    username: decodeURIComponent(username),
    password: decodeURIComponent(password),
    encrypted: !["disable", null].includes(searchParams.get("sslmode")),
  };
}
