import { compare, hash } from "bcryptjs";

/** 2^10 rounds, the least that OWASP's password storage cheat sheet accepts for bcrypt: near 80 ms on a small server. */
const COST = 10;

/** Of a password that nobody has: checking against it makes an unknown address take as long as a known one. */
const nobodysHash = "$2b$10$tPH2mWqwLqWfG13NrIIXH.Jfac6zOkDYgFSUPNDn2e4xnHKs3O9G.";

export function hashPassword(password: string): Promise<string> {
  return hash(password, COST);
}

/** Whether the password is the one that was hashed; false, after the same time, where there is no hash. */
export async function passwordMatches(password: string, passwordHash: string | null): Promise<boolean> {
  const matches = await compare(password, passwordHash ?? nobodysHash);
  return passwordHash !== null && matches;
}
