import { differenceInYears, parseISO } from "date-fns";

/** Whole years lived on a calendar date; who is born on 29 February is a year older on 1 March of other years. */
export function ageInYears({ birthDate, onDate }: { birthDate: string; onDate: string }): number {
  return differenceInYears(parseISO(onDate), parseISO(birthDate));
}
