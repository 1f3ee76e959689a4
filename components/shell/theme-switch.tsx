"use client";

import { useTheme } from "next-themes";

/** Day to night and back; remembered on this device. */
export function useThemeToggle(): () => void {
  const { resolvedTheme, setTheme } = useTheme();
  return () => setTheme(resolvedTheme === "night" ? "day" : "night");
}

/** Named by where it leads: 'Night' by day, 'Day' by night. Which one shows is CSS, so the server need not know. */
export function ThemeWord() {
  return (
    <>
      <span className="night:hidden">Night</span>
      <span className="hidden night:inline">Day</span>
    </>
  );
}

export function ThemeSwitch({ className = "" }: { className?: string }) {
  const toggle = useThemeToggle();
  return (
    <button type="button" onClick={toggle} className={`min-h-11 text-[15px] text-muted hover:text-ink ${className}`}>
      <ThemeWord />
    </button>
  );
}
