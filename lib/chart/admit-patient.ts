import { VentilationEpisode, type Patient } from "@/db/models";
import type { Ctx } from "@/lib/access/context";
import type { GrantedUnit, PatientRow } from "@/lib/access/granted";
import { AppError, type AdmissionAnswer, type AdmissionBody } from "@/lib/contracts";
import { admissionAnswer } from "./admission-answer";
import { admissionConflict, bedTaken } from "./admission-conflict";
import { admissionIssues } from "./admission-issues";
import { auditChange } from "./audit";
import { chartedMoment } from "./charted-moment";
import { fileEntries, submissionOf } from "./file-entries";
import { refuseIssues } from "./judge-entry";
import { patientOfAdmission } from "./patient-of-admission";
import { announceChart } from "./queries/announce-chart";
import { lockBed, occupyBed, type LockedBed } from "./queries/occupy-bed";
import { heightDetail } from "./record-height";

type Granted = GrantedUnit<"patients:admit">;

async function freeBed(ctx: Ctx, { unitId }: Granted, bedId: string): Promise<LockedBed> {
  const bed = await lockBed({ unitId, bedId }, ctx.transaction);
  if (!bed) {
    const message = "Not a bed of this unit.";
    throw new AppError("validation-failed", message, { errors: [{ path: "bedId", message }] });
  }
  if (bed.taken) throw bedTaken(bed.label);
  return bed;
}

async function beginEpisode(
  ctx: Ctx,
  granted: Granted,
  patient: Patient,
  body: AdmissionBody,
): Promise<VentilationEpisode> {
  const { reasonForVentilation, ardsRiskFactor, tubeSizeMm, tubeDepthCm } = body;
  return VentilationEpisode.create(
    {
      patientId: patient.id,
      unitId: granted.unitId,
      submissionId: submissionOf(ctx),
      intubatedAt: new Date(Math.min(Date.parse(body.intubatedAt), ctx.now.getTime())),
      endedAt: null,
      endReason: null,
      reasonForVentilation: reasonForVentilation || null,
      ardsRiskFactor: ardsRiskFactor || null,
      tubeSizeMm: tubeSizeMm ?? null,
      tubeDepthCm: tubeDepthCm ?? null,
    },
    { transaction: ctx.transaction },
  );
}

async function fileHeight(ctx: Ctx, row: PatientRow, { height, birthDate }: AdmissionBody): Promise<void> {
  if (!height) return;
  const { chartedAt = ctx.now.toISOString(), ...length } = height;
  const moment = chartedMoment(chartedAt, { now: ctx.now, intubatedAt: row.intubatedAt, path: "height.chartedAt" });
  const body = heightDetail(length, { birthDate, moment, path: "height" });
  await fileEntries(ctx, row, "chart.height", [{ kind: "heights", moment, body }]);
}

/** Admits a patient to a free bed of the unit, and files the height if it came along. */
export async function admitPatient(ctx: Ctx, granted: Granted, body: AdmissionBody): Promise<AdmissionAnswer> {
  refuseIssues(admissionIssues(body, { now: ctx.now, timeZone: granted.policy.timeZone }));
  const bed = await freeBed(ctx, granted, body.bedId);
  try {
    const patient = await patientOfAdmission(ctx, granted, body);
    const episode = await beginEpisode(ctx, granted, patient, body);
    await occupyBed({ episodeId: episode.id, bedId: bed.id, now: ctx.now }, ctx.transaction);
    const { id: episodeId, intubatedAt } = episode;
    const row = { ...granted, patientId: patient.id, episodeId, intubatedAt, endedAt: null, pausedSince: null, bed };
    const { clientKey: _key, height: _height, ...values } = body;
    await auditChange(ctx, row, { action: "patient.admit", newValues: values });
    await announceChart(row, ctx.transaction);
    await fileHeight(ctx, row, body);
  } catch (error) {
    throw admissionConflict(error, bed.label);
  }
  return admissionAnswer(ctx, submissionOf(ctx));
}
