import { QueryTypes, type Transaction } from "sequelize";
import { sequelize } from "@/db/connection";
import type { Targets, UnitIntervals, UnitSteps } from "@/lib/protocol";
import { everKnown } from "./standing";

/** A unit with the policy in force at a moment. */
export interface UnitWithPolicy {
  id: string;
  name: string;
  timeZone: string;
  gasUnit: "mmHg" | "kPa";
  barometricPressureMmHg: number;
  nursesSetVentilators: boolean;
  intervals: Partial<UnitIntervals>;
  steps: Partial<UnitSteps>;
  defaultTargets: Partial<Omit<Targets, "origin">>;
}

/** The newest policy recorded by then; a moment before the unit's first policy is judged by that first one. */
const statement = `
  SELECT u.id::text AS id, u.name, p.time_zone AS "timeZone", p.gas_unit AS "gasUnit",
    p.barometric_pressure_mm_hg::float8 AS "barometricPressureMmHg", p.nurses_set_ventilators AS "nursesSetVentilators",
    p.intervals, p.steps, p.default_targets AS "defaultTargets"
  FROM units u CROSS JOIN LATERAL (
    SELECT q.* FROM unit_policies q WHERE q.unit_id = u.id
    ORDER BY q.recorded_at <= LEAST($at::timestamptz, $knownAt::timestamptz) DESC,
      abs(extract(epoch FROM q.recorded_at - $at::timestamptz)), q.id DESC
    LIMIT 1
  ) p
  WHERE u.id = $unitId::bigint`;

export async function loadUnit(
  { unitId, at, knownAt }: { unitId: string; at: Date; knownAt?: Date | undefined },
  transaction: Transaction,
): Promise<UnitWithPolicy> {
  const [unit] = await sequelize.query<UnitWithPolicy>(statement, {
    type: QueryTypes.SELECT,
    bind: { unitId, at, knownAt: knownAt ?? everKnown },
    transaction,
  });
  if (!unit) throw new Error(`unit ${unitId} has no policy`);
  return unit;
}
