"use client";

import { SideSheet } from "@/components/ui/side-sheet";
import { HeightForm } from "./height-form";

/** Height, and the sex used for PBW: what every mL/kg rests on. */
export function HeightSheet({ open, onClose }: { open: boolean; onClose: () => void }) {
  return (
    <SideSheet open={open} onClose={onClose} title="Height">
      {open && <HeightForm onDone={onClose} />}
    </SideSheet>
  );
}
