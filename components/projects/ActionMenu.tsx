"use client";

import Link from "next/link";
import { useEffect, useRef, type ReactNode } from "react";
import { Icon } from "../marks/Icon";

const lineClasses = "flex min-h-10 w-full items-center px-4 text-left text-table text-ink no-underline hover:bg-well focus-visible:bg-well";

export interface MenuAction {
  label: string;
  act: () => void;
}

interface Props {
  /** "What can be done with Lot 7": the button has no words of its own. */
  label: string;
  links: readonly { label: string; href: string }[];
  actions: readonly MenuAction[];
  /** Why there are no more. */
  reason?: ReactNode;
}

/** What can be done with one line, behind a button; Esc and a press elsewhere close it. */
export function ActionMenu({ label, links, actions, reason }: Props) {
  const menu = useRef<HTMLDetailsElement>(null);
  useEffect(() => {
    function close(event: Event) {
      const element = menu.current;
      if (!element?.open) return;
      if (event instanceof KeyboardEvent) {
        if (event.key !== "Escape") return;
        element.querySelector("summary")?.focus();
      } else if (element.contains(event.target as Node)) return;
      element.open = false;
    }
    const ways = ["keydown", "pointerdown", "focusin"] as const;
    ways.forEach((way) => document.addEventListener(way, close));
    return () => ways.forEach((way) => document.removeEventListener(way, close));
  }, []);
  const doAndClose = (act: () => void) => {
    if (menu.current) menu.current.open = false;
    act();
  };
  return (
    <details ref={menu} className="group relative">
      <summary
        aria-label={label}
        className="grid size-10 list-none place-items-center rounded-control border-[1.5px] border-transparent text-ink2 hover:border-edge hover:text-ink group-open:border-edge [&::-webkit-details-marker]:hidden"
      >
        <Icon name="more" />
      </summary>
      <ul className="absolute right-0 top-11 z-30 w-56 rounded-sheet border border-edge bg-sheet py-1.5">
        {links.map((link) => (
          <li key={link.href}>
            <Link href={link.href} className={lineClasses}>
              {link.label}
            </Link>
          </li>
        ))}
        {actions.map((action) => (
          <li key={action.label}>
            <button type="button" className={lineClasses} onClick={() => doAndClose(action.act)}>
              {action.label}
            </button>
          </li>
        ))}
        {reason && <li className="px-4 py-2 text-second text-ink2">{reason}</li>}
      </ul>
    </details>
  );
}
