"use client";

import { Menu } from "lucide-react";
import { signOut } from "next-auth/react";
import { DropdownMenu } from "radix-ui";
import type { ReactNode } from "react";
import { ThemeWord, useThemeToggle } from "./theme-switch";

export interface UserMenuProps {
  /** 'M. Okafor, RT' */
  name: string;
  /** Further entries, for the phone. */
  children?: ReactNode;
}

const item =
  "flex min-h-11 cursor-pointer items-center px-4 text-[16px] text-ink outline-offset-[-3px] data-highlighted:bg-accent-soft";

/** The signed-in person, and the way out. On a phone it is a button of three lines and holds the links too. */
export function UserMenu({ name, children }: UserMenuProps) {
  return (
    <DropdownMenu.Root>
      <DropdownMenu.Trigger className="grid min-h-11 min-w-11 place-items-center text-[15px] text-muted hover:text-ink">
        <span className="hidden tablet:inline">{name}</span>
        <Menu aria-hidden="true" size={24} className="tablet:hidden" />
        <span className="sr-only tablet:hidden">Menu</span>
      </DropdownMenu.Trigger>
      <DropdownMenu.Portal>
        <DropdownMenu.Content
          align="end"
          className="z-50 min-w-[220px] border-[1.5px] border-rule bg-surface py-1 font-words"
        >
          <DropdownMenu.Label className="px-4 py-2 t-label text-muted">{name}</DropdownMenu.Label>
          {children}
          <DropdownMenu.Item className={item} onSelect={() => void signOut({ callbackUrl: "/sign-in" })}>
            Sign out
          </DropdownMenu.Item>
        </DropdownMenu.Content>
      </DropdownMenu.Portal>
    </DropdownMenu.Root>
  );
}

/** One link of the menu, on the phone only. */
export function UserMenuLink({ children }: { children: ReactNode }) {
  return (
    <DropdownMenu.Item asChild className={`${item} tablet:hidden`}>
      {children}
    </DropdownMenu.Item>
  );
}

/** The theme's switch as an entry, on the phone only. */
export function UserMenuTheme() {
  const toggle = useThemeToggle();
  return (
    <DropdownMenu.Item className={`${item} tablet:hidden`} onSelect={toggle}>
      <ThemeWord />
    </DropdownMenu.Item>
  );
}
