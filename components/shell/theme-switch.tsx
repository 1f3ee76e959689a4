"use client";

import { useTheme } from "next-themes";

/** Named by where it leads: 'Night' by day, 'Day' by night. Which one shows is CSS, so the server need not know. */
export function ThemeSwitch({ className = "" }: { className?: string }) {
  const { resolvedTheme, setTheme } = useTheme();
  return (
    <button
      type="button"
      onClick={() => setTheme(resolvedTheme === "night" ? "day" : "night")}
      className={`min-h-11 text-[15px] text-muted hover:text-ink ${className}`}
    >
      <span className="night:hidden">Night</span>
      <span className="hidden night:inline">Day</span>
    </button>
  );
}
