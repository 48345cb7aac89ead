import Link from "next/link";
import type { ReactNode } from "react";
import { BrandMark } from "../marks/BrandMark";
import { SkipLink } from "./SkipLink";
import { ThemeSwitch } from "./ThemeSwitch";
import { UserMenu, type Person } from "./UserMenu";
import type { Theme } from "./theme";

interface Props {
  theme?: Theme;
  user?: Person;
  /** The yard one is in, and which build of it. */
  crumb?: { name: string; says?: string };
  /** "Weighed today 21:04" */
  note?: ReactNode;
  action?: ReactNode;
  home?: string;
  skipTo?: string;
  skipWords?: string;
  /** The beam with the stages, inside a yard. */
  children?: ReactNode;
}

/** Head of every page, closed by the notched rule. */
export function Header({ theme, user, crumb, note, action, home = "/", skipTo = "#verdict", skipWords = "Skip to the verdict", children }: Props) {
  return (
    <header className="screen-only relative mb-2">
      <SkipLink to={skipTo}>{skipWords}</SkipLink>
      <div className="flex flex-wrap items-center gap-x-3 gap-y-1 bg-sheet px-4 py-2.5 mid:flex-nowrap mid:gap-5 mid:px-6 mid:pb-3 mid:pt-3.5 wide:px-8">
        <Link href={home} className="figure flex min-h-10 items-center gap-2.5 text-[20px] font-[680] leading-none tracking-[-.015em] no-underline mid:text-[23px]">
          <BrandMark />
          Stillyard
        </Link>
        {crumb && (
          <p className="order-last flex min-w-0 basis-full items-baseline gap-2.5 text-second mid:order-none mid:basis-auto mid:border-l-[1.5px] mid:border-rule mid:pl-5 mid:text-base">
            <b className="truncate font-semibold">{crumb.name}</b>
            {crumb.says && <span className="flex-none text-ink2">{crumb.says}</span>}
          </p>
        )}
        <div className="ml-auto flex flex-none items-center gap-2 mid:gap-3">
          {note && <span className="hidden text-second text-ink3 desk:inline">{note}</span>}
          {action && <div className="hidden mid:block">{action}</div>}
          <ThemeSwitch theme={theme} signedIn={user !== undefined} />
          {user && <UserMenu user={user} />}
        </div>
        {action && <div className="order-last flex basis-full flex-col py-1 mid:hidden">{action}</div>}
      </div>
      {children}
      <div aria-hidden="true" className="notched absolute inset-x-0 top-full h-[7px] bg-[position:16px_0] mid:bg-[position:24px_0] wide:bg-[position:32px_0]" />
    </header>
  );
}
