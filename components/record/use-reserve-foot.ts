"use client";

import { useEffect, useRef } from "react";

/**
 * Keeps what has focus clear of the pinned head and foot: the fields' own scroll margins are their heights. Padding of the page would
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
      const head = document.querySelector<HTMLElement>("[data-record-head]");
      root.style.setProperty("--record-foot", pinned ? `${element.offsetHeight}px` : "0px");
      root.style.setProperty("--record-head", pinned ? `${head?.offsetHeight ?? 0}px` : "0px");
    };
    root.style.scrollPaddingTop = "0px";
    root.style.scrollPaddingBottom = "0px";
    const observer = new ResizeObserver(reserve);
    observer.observe(element);
    const head = document.querySelector("[data-record-head]");
    if (head) observer.observe(head);
    return () => {
      observer.disconnect();
      root.style.scrollPaddingBottom = "";
      root.style.scrollPaddingTop = "";
      root.style.removeProperty("--record-foot");
      root.style.removeProperty("--record-head");
    };
  }, []);
  return foot;
}
