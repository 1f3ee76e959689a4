import { BedStay, Patient, VentilationEpisode } from "@/db/models";
import type { Ctx } from "@/lib/access/context";
import type { AdmissionAnswer } from "@/lib/contracts";

type AdmittedEpisode = VentilationEpisode & { patient: Patient; bedStays: BedStay[] };

/** The admission that a submission made, as it stands now: the answer to its first sending and to every repeat. */
export async function admissionAnswer({ transaction }: Ctx, submissionId: string): Promise<AdmissionAnswer> {
  const episode = (await VentilationEpisode.findOne({
    where: { submissionId },
    include: [
      { model: Patient, as: "patient" },
      { model: BedStay, as: "bedStays" },
    ],
    order: [[{ model: BedStay, as: "bedStays" }, "id", "DESC"]],
    transaction,
    rejectOnEmpty: true,
  })) as AdmittedEpisode;
  const { patient, bedStays, id, unitId, intubatedAt } = episode;
  return {
    patient: { id: patient.id, name: patient.name, birthDate: patient.birthDate, mrn: patient.mrn },
    episode: { id, unitId, bedId: bedStays[0]?.bedId ?? "", intubatedAt: intubatedAt.toISOString() },
  };
}
