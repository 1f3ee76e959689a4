import type { Actor } from "./context";
import type { Member } from "./can";
import type { Right, RightScope, ScopeOf } from "./rights";

/** The newest policy of a unit, as far as rights and times need it. */
interface UnitPolicyInForce {
  timeZone: string;
  gasUnit: "mmHg" | "kPa";
  barometricPressureMmHg: number;
  nursesSetVentilators: boolean;
}

export interface UnitRow {
  unitId: string;
  hospitalId: string;
  unitName: string;
  /** What the person asking is in this unit. */
  member: Member;
  policy: UnitPolicyInForce;
}

/** One patient's episode, found through the patient's id and scoped by the unit where it runs. */
export interface PatientRow extends UnitRow {
  patientId: string;
  episodeId: string;
  intubatedAt: Date;
  endedAt: Date | null;
  pausedSince: Date | null;
  bed: { id: string; label: string } | null;
}

interface SelfRow {
  actor: Actor;
}

export interface HospitalRow {
  hospitalIds: readonly string[];
}

interface RowOfScope {
  self: SelfRow;
  patient: PatientRow;
  unit: UnitRow;
  admission: UnitRow;
  hospital: HospitalRow;
}

export type RowOf<Scope extends RightScope> = RowOfScope[Scope];

declare const held: unique symbol;

/** A row that this person was granted under this right. Only `grant` makes one: a row found is not a row granted. */
type Granted<Row, Held extends Right> = Row & { readonly [held]: Held };

export type GrantOf<Held extends Right> = Granted<RowOf<ScopeOf<Held>>, Held>;

/** What a use case about one patient takes. */
export type GrantedPatient<Held extends Right> = Granted<PatientRow, Held>;
export type GrantedUnit<Held extends Right> = Granted<UnitRow, Held>;
