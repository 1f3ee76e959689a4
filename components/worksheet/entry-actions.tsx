import Link from "next/link";
import type { Worksheet } from "@/lib/contracts";
import { dueInOrder, dueSentence } from "./due-words";

const quiet = "control rounded-[6px] bg-paper px-4 t-state inline-flex items-center justify-center min-h-[44px]";
const primary =
  "rounded-[6px] border-[1.5px] border-accent bg-accent px-4 t-state text-on-accent inline-flex items-center justify-center min-h-[44px]";

/** The two ways into the record form; each is shown only to those who may chart through it. */
export function EntryActions({ sheet }: { sheet: Worksheet }) {
  const { can, patient } = sheet;
  const record = `/patients/${patient.id}/record`;
  return (
    <>
      {(can.mechanics || can.observations) && (
        <Link href={`${record}?focus=measurements`} className={quiet}>
          Enter measurements
        </Link>
      )}
      {can.settings && (
        <Link href={`${record}?focus=settings`} className={primary}>
          Enter settings
        </Link>
      )}
    </>
  );
}

/** At 1024 and on the phone: what is due in words, and the ways to enter, pinned. */
export function EntryBar({ sheet, now }: { sheet: Worksheet; now: number }) {
  const due = dueInOrder(sheet.due, now);
  const words = due.slice(0, 2).map((each) => dueSentence(each, now, sheet.unit.timeZone));
  return (
    <div className="sticky bottom-0 z-10 flex min-h-[72px] items-center gap-3 border-t border-hair bg-surface page-margin py-2 desk:hidden">
      <p className="mr-auto t-head max-tablet:hidden">{words.length > 0 ? words.join(", ") : "Nothing is due"}</p>
      <div className="flex gap-2.5 max-tablet:w-full max-tablet:*:flex-1">
        <EntryActions sheet={sheet} />
      </div>
    </div>
  );
}
