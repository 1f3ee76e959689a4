import type { ReactNode } from "react";
import { CautionLine } from "./caution-line";
import { TopBar, type TopBarProps } from "./top-bar";

interface PageFrameProps {
  bar: TopBarProps;
  /** False where a phone needs the height for entry, and the page's own header leads back. */
  barOnPhone?: boolean;
  children: ReactNode;
}

/** A clinical screen: top bar, the page, the caution at its foot. */
export function PageFrame({ bar, barOnPhone = true, children }: PageFrameProps) {
  return (
    <div className="flex min-h-dvh flex-col">
      <a
        href="#page"
        className="sr-only focus:not-sr-only focus:fixed focus:top-2 focus:left-2 focus:z-50 focus:bg-surface focus:px-4 focus:py-2"
      >
        To the page
      </a>
      <div className={barOnPhone ? "contents" : "contents max-tablet:hidden"}>
        <TopBar {...bar} />
      </div>
      <main id="page" className="flex min-w-0 flex-1 flex-col">
        {children}
      </main>
      <CautionLine />
    </div>
  );
}
