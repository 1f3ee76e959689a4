"use client";

import Link from "next/link";
import { DemoChip } from "./demo-chip";
import { Mark, Wordmark } from "./mark";
import { ThemeSwitch } from "./theme-switch";
import { UnitClock } from "./unit-clock";
import { UserMenu, UserMenuLink, UserMenuTheme } from "./user-menu";

export interface TopBarProps {
  /** Which link is this page. */
  here: "beds" | "worksheet" | null;
  /** The patient last seen; null leads to Beds. */
  worksheetHref: string | null;
  unit: { name: string; timeZone: string; shift?: string } | null;
  /** 'M. Okafor, RT' */
  userName: string;
  /** The server's moment, ISO 8601. */
  now: string;
  /** An administrator sees no patients: neither Beds nor Worksheet. */
  clinical?: boolean;
}

const titles = { beds: "Beds", worksheet: "Worksheet" };

/** 52 tall. On a phone: mark, page, DEMO, unit, clock; the links and the way out are behind the menu. */
export function TopBar({ here, worksheetHref, unit, userName, now, clinical = true }: TopBarProps) {
  const links = clinical
    ? [
        { key: "beds", href: "/beds", words: "Beds" },
        { key: "worksheet", href: worksheetHref ?? "/beds", words: "Worksheet" },
      ]
    : [];
  return (
    <header
      data-screen-only
      className="flex h-13 items-center gap-2 border-b border-hair bg-paper page-margin tablet:gap-3"
    >
      <span className="hidden tablet:inline-flex">
        <Wordmark />
      </span>
      <span className="flex items-center gap-2.5 tablet:hidden">
        <span className="max-[359px]:hidden">
          <Mark />
        </span>
        <span className="text-[18px] font-[680]">{here ? titles[here] : "Neaptide"}</span>
      </span>
      <DemoChip />
      <nav aria-label="Pages" className="hidden self-stretch tablet:flex desk:ml-1">
        {links.map(({ key, href, words }) => (
          <Link
            key={key}
            href={href}
            aria-current={key === here ? "page" : undefined}
            className={`flex items-center border-b-3 px-3.5 pt-[3px] text-[16px] ${key === here ? "border-accent font-[640] text-ink" : "border-transparent text-muted hover:text-ink"}`}
          >
            {words}
          </Link>
        ))}
      </nav>
      <div className="ml-auto flex min-w-0 items-center gap-3 tablet:gap-4 desk:gap-6">
        {unit && (
          <span
            className={`truncate text-[15px] text-muted max-[359px]:hidden tablet:hidden desk:inline ${here === "beds" ? "" : "max-tablet:hidden"}`}
          >
            {unit.name}
            {unit.shift && <span className="hidden desk:inline">, {unit.shift}</span>}
          </span>
        )}
        <span className="order-last tablet:order-none">
          <UserMenu name={userName}>
            {links.map(({ key, href, words }) => (
              <UserMenuLink key={key}>
                <Link href={href}>{words}</Link>
              </UserMenuLink>
            ))}
            <UserMenuTheme />
          </UserMenu>
        </span>
        <ThemeSwitch className="hidden tablet:block" />
        {unit && <UnitClock timeZone={unit.timeZone} now={now} />}
      </div>
    </header>
  );
}
