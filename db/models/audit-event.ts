import { Model, type CreationOptional, type InferAttributes, type InferCreationAttributes } from "sequelize";
import { sequelize } from "../connection";
import { id, json, optionalReference, optionalText, recordedMoment, text } from "./columns";

/** Who did what, with old and new values of what may change. Never a charted value, a name or an MRN in `action`. */
export class AuditEvent extends Model<InferAttributes<AuditEvent>, InferCreationAttributes<AuditEvent>> {
  declare id: CreationOptional<string>;
  declare recordedAt: CreationOptional<Date>;
  declare actorId: string | null;
  declare action: string;
  declare hospitalId: string | null;
  declare unitId: string | null;
  declare patientId: string | null;
  declare submissionId: string | null;
  declare subject: string | null;
  declare subjectId: string | null;
  declare oldValues: object | null;
  declare newValues: object | null;
  declare requestId: string | null;
  /** Set on reads: one row a person, patient and quarter of an hour. */
  declare dedupeKey: string | null;
}

AuditEvent.init(
  {
    id: id(),
    recordedAt: recordedMoment(),
    actorId: optionalReference(),
    action: text(),
    hospitalId: optionalReference(),
    unitId: optionalReference(),
    patientId: optionalReference(),
    submissionId: optionalReference(),
    subject: optionalText(),
    subjectId: optionalText(),
    oldValues: json(),
    newValues: json(),
    requestId: optionalText(),
    dedupeKey: optionalText(),
  },
  { sequelize, tableName: "audit_events" },
);
