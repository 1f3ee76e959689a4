"use client";

import { useEffect, useRef } from "react";

/** Keeps what has focus clear of the pinned foot: the page scrolls as if it ended above it. */
export function useReserveFoot() {
  const foot = useRef<HTMLDivElement>(null);
  useEffect(() => {
    const element = foot.current;
    if (!element || typeof ResizeObserver === "undefined") return;
    const root = document.documentElement;
    const reserve = () => {
      const pinned = getComputedStyle(element).position === "sticky";
      root.style.scrollPaddingBottom = pinned ? `${element.offsetHeight + 12}px` : "";
    };
    const observer = new ResizeObserver(reserve);
    observer.observe(element);
    return () => {
      observer.disconnect();
      root.style.scrollPaddingBottom = "";
    };
  }, []);
  return foot;
}
