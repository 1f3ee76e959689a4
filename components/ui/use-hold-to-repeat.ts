import { useEffect, useRef, useState } from "react";

type Direction = 1 | -1;

/** Before the first repeat, and between the next ones, ms. */
const delayMs = 450;
const intervalMs = 110;

/**
 * Press for one step, hold for more. A held step that `repeat` refuses (it returns false) ends the holding: the next
 * one needs a press of its own.
 */
export function useHoldToRepeat(on: {
  press: (direction: Direction) => void;
  repeat: (direction: Direction) => boolean;
}) {
  const [held, setHeld] = useState<{ direction: Direction; times: number } | null>(null);
  const repeated = useRef(false);
  const { press, repeat } = on;

  useEffect(() => {
    if (held === null) return;
    const timer = setTimeout(
      () => {
        repeated.current = true;
        setHeld(repeat(held.direction) ? { ...held, times: held.times + 1 } : null);
      },
      held.times === 0 ? delayMs : intervalMs,
    );
    return () => clearTimeout(timer);
  }, [held, repeat]);

  const release = () => setHeld(null);
  return (direction: Direction) => ({
    onPointerDown: () => {
      repeated.current = false;
      setHeld({ direction, times: 0 });
    },
    onPointerUp: release,
    onPointerLeave: release,
    onPointerCancel: release,
    // A press counts on release, as a click: a finger that scrolls past the button changes nothing.
    onClick: () => {
      if (!repeated.current) press(direction);
      repeated.current = false;
    },
  });
}
