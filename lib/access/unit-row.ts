import { Unit, UnitPolicy } from "@/db/models";
import type { Membership } from "./context";
import type { UnitRow } from "./granted";

/** The unit of one's membership, with the policy in force. */
export async function unitRow({ unitId, role, lead }: Membership): Promise<UnitRow> {
  const [unit, policy] = await Promise.all([
    Unit.findByPk(unitId, { rejectOnEmpty: true }),
    UnitPolicy.findOne({
      attributes: ["timeZone", "gasUnit", "barometricPressureMmHg", "nursesSetVentilators"],
      where: { unitId },
      order: [
        ["recordedAt", "DESC"],
        ["id", "DESC"],
      ],
      rejectOnEmpty: true,
    }),
  ]);
  const { timeZone, gasUnit, barometricPressureMmHg, nursesSetVentilators } = policy;
  return {
    unitId,
    hospitalId: unit.hospitalId,
    unitName: unit.name,
    member: { role, lead },
    policy: { timeZone, gasUnit, barometricPressureMmHg, nursesSetVentilators },
  };
}
