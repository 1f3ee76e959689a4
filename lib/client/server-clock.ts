"use client";

import { useCallback, useSyncExternalStore } from "react";

/** How far the server's clock is ahead of this device's, in ms; null until an answer has told. */
let aheadMs: number | null = null;
const listeners = new Set<() => void>();

/** Every answer that carries the server's `at` sets the clock by which ages are counted here. */
export function observeServerTime(at: string, receivedMs = Date.now()): void {
  aheadMs = Date.parse(at) - receivedMs;
  listeners.forEach((listener) => listener());
}

/** Now, by the server's clock, in ms since 1970. */
export function serverNow(): number {
  return Date.now() + (aheadMs ?? 0);
}

const toldFromMs = 2 * 60_000;

/** Whole minutes by which this device's clock is off, negative when behind; 0 up to 2 minutes, which is not worth telling. */
export function deviceClockOffMinutes(): number {
  const offMs = -(aheadMs ?? 0);
  return Math.abs(offMs) > toldFromMs ? Math.round(offMs / 60_000) : 0;
}

function subscribe(listener: () => void): () => void {
  listeners.add(listener);
  return () => listeners.delete(listener);
}

export function useDeviceClockOffMinutes(): number {
  return useSyncExternalStore(subscribe, deviceClockOffMinutes, () => 0);
}

/**
 * The server's time, moving in steps of `everyMs`, for ages on screen. While the page is made, and on its first
 * rendering here, it is the answer's own `at`, so that server and browser draw the same words.
 */
export function useServerNow(at: string, everyMs = 15_000): number {
  const listen = useCallback(
    (listener: () => void) => {
      const timer = setInterval(listener, everyMs);
      const stop = subscribe(listener);
      return () => {
        clearInterval(timer);
        stop();
      };
    },
    [everyMs],
  );
  // A step keeps the snapshot equal between two ticks; it never falls before the answer that is shown.
  const snapshot = () => Math.max(Date.parse(at), Math.floor(serverNow() / everyMs) * everyMs);
  return useSyncExternalStore(listen, snapshot, () => Date.parse(at));
}
