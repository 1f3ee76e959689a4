"use client";

import { useEffect, useRef } from "react";

/**
 * Keeps what has focus clear of the pinned foot: the fields' own scroll margin is its height. Padding of the page would
 * not do, since what stands in the foot would then be scrolled to as well.
 */
export function useReserveFoot() {
  const foot = useRef<HTMLDivElement>(null);
  useEffect(() => {
    const element = foot.current;
    if (!element || typeof ResizeObserver === "undefined") return;
    const root = document.documentElement;
    const reserve = () => {
      const pinned = getComputedStyle(element).position === "sticky";
      root.style.setProperty("--record-foot", pinned ? `${element.offsetHeight}px` : "0px");
    };
    root.style.scrollPaddingBottom = "0px";
    const observer = new ResizeObserver(reserve);
    observer.observe(element);
    return () => {
      observer.disconnect();
      root.style.scrollPaddingBottom = "";
      root.style.removeProperty("--record-foot");
    };
  }, []);
  return foot;
}
