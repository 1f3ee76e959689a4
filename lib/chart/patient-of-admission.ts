import { Patient, VentilationEpisode } from "@/db/models";
import type { Ctx } from "@/lib/access/context";
import type { UnitRow } from "@/lib/access/granted";
import { AppError, type AdmissionBody } from "@/lib/contracts";
import { alreadyAdmitted } from "./admission-conflict";

/** The hospital's patient of this MRN, made if new; known to whoever gives MRN and birth date exactly. */
export async function patientOfAdmission(
  { transaction }: Ctx,
  { hospitalId }: UnitRow,
  { mrn, name, birthDate }: AdmissionBody,
): Promise<Patient> {
  await Patient.bulkCreate([{ hospitalId, mrn, name, birthDate }], { ignoreDuplicates: true, transaction });
  const patient = await Patient.findOne({ where: { hospitalId, mrn }, transaction, rejectOnEmpty: true });
  if (patient.birthDate !== birthDate) {
    const message = "This MRN belongs to a patient with another birth date: check both.";
    throw new AppError("validation-failed", message, { errors: [{ path: "mrn", message }] });
  }
  const open = await VentilationEpisode.count({ where: { patientId: patient.id, endedAt: null }, transaction });
  if (open > 0) throw alreadyAdmitted();
  return patient;
}
