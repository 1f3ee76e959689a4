"use client";

import { useRouter } from "next/navigation";
import { Button } from "@/components/ui/button";
import { Question } from "@/components/ui/question";
import { useLeaveGuard } from "./use-leave-guard";

interface LeaveQuestionProps {
  unsaved: boolean;
  /** Being sent: leaving stops the tries, which go on when the form is opened again. */
  sending: boolean;
  onDiscard: () => void;
}

/** Asks before a link leads away from typed work. The draft stays on this device unless it is discarded. */
export function LeaveQuestion({ unsaved, sending, onDiscard }: LeaveQuestionProps) {
  const { asked, stay } = useLeaveGuard(unsaved);
  const router = useRouter();
  const leave = () => {
    if (asked) router.push(new URL(asked).pathname);
    stay();
  };
  return (
    <Question
      open={asked !== null}
      title={sending ? "Leave while it is being sent?" : "Leave without saving?"}
      onClose={stay}
      actions={
        <>
          <Button size="entry" look="primary" onClick={stay}>
            Stay
          </Button>
          <Button size="entry" onClick={leave}>
            Leave, keep the draft
          </Button>
          {!sending && (
            <Button
              size="entry"
              onClick={() => {
                onDiscard();
                leave();
              }}
            >
              Leave, discard it
            </Button>
          )}
        </>
      }
    >
      {sending
        ? "It is not on record yet. It stays on this device and goes on when you open this form again."
        : "What you typed is not on record. The draft stays on this device, for you and this patient’s stay only."}
    </Question>
  );
}
