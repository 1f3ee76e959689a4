import type { AdmissionBody, Issue } from "@/lib/contracts";
import { localDate } from "@/lib/format";
import { ageInYears } from "./age-in-years";

/** Adults only: under 18 is asked on the form, under this it is refused. */
const YOUNGEST_YEARS = 16;
/** Beyond this a year was mistyped. */
const OLDEST_YEARS = 120;
const AHEAD_MS = 5 * 60_000;

/** What stands against these dates, at `now` by the unit's calendar. */
export function admissionIssues(
  { birthDate, intubatedAt }: Pick<AdmissionBody, "birthDate" | "intubatedAt">,
  { now, timeZone }: { now: Date; timeZone: string },
): Issue[] {
  const issues: Issue[] = [];
  const years = ageInYears({ birthDate, onDate: localDate({ at: now, timeZone }) });
  const intubated = Date.parse(intubatedAt);
  if (years < YOUNGEST_YEARS)
    issues.push({ path: "birthDate", message: "Under 16 years is refused: the limits here hold for adults only." });
  if (years > OLDEST_YEARS) issues.push({ path: "birthDate", message: "More than 120 years ago: check the year." });
  if (Number.isNaN(intubated) || intubated - now.getTime() > AHEAD_MS)
    issues.push({ path: "intubatedAt", message: "Intubation lies ahead: enter when it took place." });
  if (intubated < Date.parse(birthDate))
    issues.push({ path: "intubatedAt", message: "Intubation lies before birth: check the date." });
  return issues;
}
