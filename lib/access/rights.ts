/**
 * Who may do what: the whole table of product 3 as data. Everything that asks for a right, server and screens alike,
 * asks `can()`; a person's role belongs to a membership of one unit and counts nowhere else.
 *
 * - `yes`, `no`
 * - `lead`: members marked as lead
 * - `fio2-only`: FiO2 alone, and every setting where the unit says that nurses set ventilators
 * - `where-nurses-set`: only where the unit says that nurses set ventilators
 * - `own-kinds`: entries of a kind this person may chart
 * - `cuff-only`: cuff pressure and nothing else
 */
export type Answer = "yes" | "no" | "lead" | "fio2-only" | "where-nurses-set" | "own-kinds" | "cuff-only";

/**
 * Where a right holds. `self`: anyone signed in, about themselves. `patient` and `unit`: the row named in the path.
 * `admission`: the unit named in the body. `hospital`: the hospital that an administrator runs.
 */
export type RightScope = "self" | "patient" | "unit" | "admission" | "hospital";

interface RightLine<Scope extends RightScope = RightScope> {
  scope: Scope;
  therapist: Answer;
  intensivist: Answer;
  nurse: Answer;
  administrator: "yes" | "no";
}

const line = <Scope extends RightScope>(
  scope: Scope,
  therapist: Answer,
  intensivist: Answer,
  nurse: Answer,
  administrator: "yes" | "no" = "no",
): RightLine<Scope> => ({ scope, therapist, intensivist, nurse, administrator });

const all = <Scope extends RightScope>(scope: Scope) => line(scope, "yes", "yes", "yes");
const setters = <Scope extends RightScope>(scope: Scope) => line(scope, "yes", "yes", "no");
const prescribe = <Scope extends RightScope>(scope: Scope) => line(scope, "no", "yes", "no");
const leads = <Scope extends RightScope>(scope: Scope) => line(scope, "lead", "lead", "lead");

export const rights = {
  // right                          scope        RT     intensivist  nurse  administrator
  "session:own": line("self", "yes", "yes", "yes", "yes"),
  "patients:read": all("patient"),
  "beds:read": all("unit"),
  "patients:admit": setters("admission"),
  "patients:edit": setters("patient"),
  "episode:manage": setters("patient"),

  "heights:chart": all("patient"),
  "settings:chart": line("patient", "yes", "yes", "fio2-only"),
  "settings-checks:chart": line("patient", "yes", "yes", "where-nurses-set"),
  "mechanics:chart": setters("patient"),
  "bedside-entries:chart": line("patient", "yes", "yes", "fio2-only"),
  "therapies:chart": setters("patient"),
  "airway-checks:chart": line("patient", "yes", "yes", "cuff-only"),
  "observations:chart": all("patient"),
  "blood-gases:chart": all("patient"),
  "weights:chart": all("patient"),
  "conditions:chart": all("patient"),
  "positions:chart": all("patient"),
  "sedation:chart": all("patient"),
  "fluids:chart": all("patient"),
  "care-checks:chart": all("patient"),
  "notes:chart": all("patient"),
  "attachments:chart": all("patient"),
  "handover-questions:chart": all("patient"),

  "targets:order": prescribe("patient"),
  "ards-assessments:chart": prescribe("patient"),
  "rounds-reviews:chart": prescribe("patient"),
  "acknowledgements:chart": all("patient"),
  "handover:take-over": all("unit"),
  "entries:correct": line("patient", "own-kinds", "yes", "own-kinds"),

  "intake:file": setters("unit"),
  "intake:tokens": line("hospital", "no", "no", "no", "yes"),
  "hours-inside:read": leads("unit"),
  "next-steps:switch": leads("unit"),
  "staff:manage": line("hospital", "no", "no", "no", "yes"),
  "units:manage": line("hospital", "no", "no", "no", "yes"),
  "audit:read": line("hospital", "no", "no", "no", "yes"),
} as const satisfies Record<string, RightLine>;

export type Right = keyof typeof rights;

export type ScopeOf<Held extends Right> = (typeof rights)[Held]["scope"];
