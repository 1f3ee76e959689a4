import type { Transaction } from "sequelize";
import type { Role } from "@/lib/contracts";

export interface Membership {
  unitId: string;
  role: Role;
  lead: boolean;
}

/** Who is asking. Ids are strings; an administrator belongs to hospitals and to no unit. */
export interface Actor {
  userId: string;
  name: string;
  email: string;
  sessionId: string;
  memberships: readonly Membership[];
  administersHospitalIds: readonly string[];
}

/**
 * What every use case is given: who asks, the moment, and the transaction it must use for each statement (a second
 * connection a request would starve the pool). `submissionId` stands on every POST that carries a `clientKey`.
 */
export interface Ctx {
  actor: Actor;
  now: Date;
  transaction: Transaction;
  requestId: string;
  submissionId: string | null;
}
