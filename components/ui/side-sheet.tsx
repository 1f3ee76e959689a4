"use client";

import { X } from "lucide-react";
import { Dialog } from "radix-ui";
import type { ReactNode } from "react";

export interface SideSheetProps {
  open: boolean;
  onClose: () => void;
  title: string;
  children: ReactNode;
}

/** A sheet over the right half of the page, the whole of a phone. Escape, the cross or a touch beside it closes it. */
export function SideSheet({ open, onClose, title, children }: SideSheetProps) {
  return (
    <Dialog.Root open={open} onOpenChange={(next) => !next && onClose()}>
      <Dialog.Portal>
        <Dialog.Overlay className="fixed inset-0 z-40 bg-ink/30" />
        <Dialog.Content
          aria-describedby={undefined}
          className="fixed inset-y-0 right-0 z-50 flex w-full flex-col overflow-y-auto border-l border-hair bg-surface text-ink tablet:w-1/2 tablet:min-w-[440px]"
        >
          <header className="flex items-center justify-between gap-4 px-6 pt-4 pb-3 rule-head">
            <Dialog.Title className="t-title">{title}</Dialog.Title>
            <Dialog.Close aria-label="Close" className="grid size-11 shrink-0 place-items-center rounded-[6px] control">
              <X aria-hidden="true" size={20} />
            </Dialog.Close>
          </header>
          <div className="px-6 py-4">{children}</div>
        </Dialog.Content>
      </Dialog.Portal>
    </Dialog.Root>
  );
}
