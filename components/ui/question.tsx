"use client";

import { Dialog } from "radix-ui";
import type { ReactNode } from "react";

export interface QuestionProps {
  open: boolean;
  title: string;
  /** What will happen, in one or two sentences. */
  children: ReactNode;
  /** The buttons, the safe one first. */
  actions: ReactNode;
  onClose: () => void;
}

/** A question that holds the page until it is answered; Escape is 'no'. */
export function Question({ open, title, children, actions, onClose }: QuestionProps) {
  return (
    <Dialog.Root open={open} onOpenChange={(next) => !next && onClose()}>
      <Dialog.Portal>
        <Dialog.Overlay className="fixed inset-0 z-40 bg-ink/30" />
        <Dialog.Content
          aria-describedby={undefined}
          className="fixed inset-x-4 bottom-4 z-50 mx-auto max-h-[90dvh] max-w-[520px] overflow-y-auto rounded-[8px] border-[1.5px] border-rule bg-surface p-6 text-ink tablet:top-1/4 tablet:bottom-auto"
        >
          <Dialog.Title className="t-title">{title}</Dialog.Title>
          <div className="mt-2 t-body">{children}</div>
          <div className="mt-5 flex flex-wrap justify-end gap-3">{actions}</div>
        </Dialog.Content>
      </Dialog.Portal>
    </Dialog.Root>
  );
}
