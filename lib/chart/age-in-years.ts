/** Whole years lived on a calendar date; who is born on 29 February is a year older on 1 March of other years. */
export function ageInYears({ birthDate, onDate }: { birthDate: string; onDate: string }): number {
  const [bornYear, bornDay] = [Number(birthDate.slice(0, 4)), birthDate.slice(5, 10)];
  const [year, day] = [Number(onDate.slice(0, 4)), onDate.slice(5, 10)];
  return year - bornYear - (day < bornDay ? 1 : 0);
}
