"use client";

import { useSyncExternalStore } from "react";

/** From here on two columns stand beside one another. */
const query = "(width >= 640px)";

const media = () => (typeof window.matchMedia === "function" ? window.matchMedia(query) : null);

function subscribe(listener: () => void): () => void {
  const list = media();
  list?.addEventListener("change", listener);
  return () => list?.removeEventListener("change", listener);
}

/** For what stands in another place of the page on a tablet, and only after a touch; a page is made as for a phone. */
export function useIsTablet(): boolean {
  return useSyncExternalStore(
    subscribe,
    () => media()?.matches ?? false,
    () => false,
  );
}
