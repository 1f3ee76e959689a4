"use client";

import { Button } from "@/components/ui/button";
import { buttonClass } from "@/components/ui/button-class";
import Link from "next/link";
import { MessagePage } from "./message-page";

const toBeds = (
  <Link href="/beds" className={buttonClass("primary", "bar")}>
    To the beds
  </Link>
);

/** Says no more than that: whether the patient exists is not told either. */
export function NotFoundMessage() {
  return (
    <MessagePage title="Not found" actions={toBeds}>
      <p>There is no such page, or it belongs to a unit that is not yours.</p>
    </MessagePage>
  );
}

export function ForbiddenMessage() {
  return (
    <MessagePage title="Not for your role" actions={toBeds}>
      <p>You are signed in, but your role in this unit does not include this page. The unit lead can say who may.</p>
    </MessagePage>
  );
}

/** `reference` is the request's id, which the log carries too. */
export function ErrorMessage({ reference, onRetry }: { reference?: string; onRetry: () => void }) {
  return (
    <MessagePage
      title="This page failed"
      actions={
        <>
          <Button look="primary" size="bar" onClick={onRetry}>
            Try again
          </Button>
          <Link href="/beds" className={buttonClass("quiet", "bar")}>
            To the beds
          </Link>
        </>
      }
    >
      <p>Nothing was charted by it. Typed work is kept on this device. Until it works, use the paper sheet.</p>
      {reference && <p className="mt-2">Reference {reference}</p>}
    </MessagePage>
  );
}
