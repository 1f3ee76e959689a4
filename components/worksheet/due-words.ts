import { clockTime } from "@/lib/format";
import type { Worksheet } from "@/lib/contracts";

type DueThing = Worksheet["due"][number];

const names: Record<DueThing["what"], string> = {
  height: "Height",
  hold: "Hold for plateau",
  spo2: "SpO2",
  gas: "Blood gas",
  "settings-check": "Settings check",
};

/** Where a row leaves little room. */
const shortNames: Partial<typeof names> = { hold: "Hold", gas: "Gas" };

/** 'Hold for plateau due 23:10', 'SpO2 due since 22:50'. */
export function dueSentence(due: DueThing, now: number, timeZone: string, short = false): string {
  const time = clockTime({ at: due.dueAt, now, timeZone });
  const name = (short && shortNames[due.what]) || names[due.what];
  return Date.parse(due.dueAt) <= now ? `${name} due since ${time}` : `${name} due ${time}`;
}

/** What people act on first: overdue, longest overdue at the top; then what comes next. SpO2 is named only once overdue. */
export function dueInOrder(due: readonly DueThing[], now: number): DueThing[] {
  return due
    .filter(({ what, dueAt }) => what !== "spo2" || Date.parse(dueAt) <= now)
    .toSorted((a, b) => Date.parse(a.dueAt) - Date.parse(b.dueAt));
}
