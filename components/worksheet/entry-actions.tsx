import Link from "next/link";
import { buttonClass } from "@/components/ui/button-class";
import type { Worksheet } from "@/lib/contracts";
import { dueInOrder, dueSentence } from "./due-words";

/** The two ways into the record form; each is shown only to those who may chart through it. */
export function EntryActions({ sheet }: { sheet: Worksheet }) {
  const { can, patient } = sheet;
  const record = `/patients/${patient.id}/record`;
  return (
    <>
      {(can.mechanics || can.observations) && (
        <Link href={`${record}?focus=measurements`} className={buttonClass("quiet", "bar")}>
          Enter measurements
        </Link>
      )}
      {can.settings && (
        <Link href={`${record}?focus=settings`} className={buttonClass("primary", "bar")}>
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
    <div className="sticky bottom-0 z-10 flex min-h-[72px] items-center gap-3 border-t border-hair bg-surface page-margin py-2 tablet:bottom-6 desk:hidden">
      <p className="mr-auto t-head max-tablet:hidden">{words.length > 0 ? words.join(", ") : "Nothing is due"}</p>
      <div className="flex gap-2.5 max-tablet:w-full max-tablet:*:flex-1 max-tablet:*:px-2">
        <EntryActions sheet={sheet} />
      </div>
    </div>
  );
}
