import { ExclusionConstraintError, UniqueConstraintError } from "sequelize";
import { AppError } from "@/lib/contracts";

export const bedTaken = (label: string) =>
  new AppError("conflict", `Bed ${label} is taken: choose a free one.`, {
    errors: [{ path: "bedId", message: "This bed is taken." }],
  });

export const alreadyAdmitted = () =>
  new AppError("conflict", "This patient already has an open episode: end or move that one first.", {
    errors: [{ path: "mrn", message: "This patient is already admitted." }],
  });

/** Who lost a race learns it from the database; it means the same as having come later. */
export function admissionConflict(error: unknown, bedLabel: string): unknown {
  if (error instanceof ExclusionConstraintError) return bedTaken(bedLabel);
  const constraint = (error as { original?: { constraint?: string; code?: string } }).original;
  if (constraint?.code === "23P01") return bedTaken(bedLabel);
  const raced =
    error instanceof UniqueConstraintError && constraint?.constraint === "ventilation_episodes_open_patient_uq";
  return raced ? alreadyAdmitted() : error;
}
