"use client";

import { useEffect, useRef, useState } from "react";
import { accountAddress, sessionRoute, signInAddress } from "../addresses";
import { Button, LinkButton } from "../ui/Button";

export interface Person {
  name: string;
  email: string;
}

function initialsOf(name: string): string {
  const words = name.trim().split(/\s+/);
  const letters = words.length > 1 ? [words[0]![0], words[words.length - 1]![0]] : [...words[0]!].slice(0, 2);
  return letters.join("").toUpperCase();
}

/** Ended already (401) is as good as ended now. */
async function signOut(): Promise<boolean> {
  try {
    const answer = await fetch(sessionRoute, { method: "DELETE" });
    return answer.ok || answer.status === 401;
  } catch {
    return false;
  }
}

/** Closes an open menu on Esc and on a press outside it. */
function useClosing(menu: React.RefObject<HTMLDetailsElement | null>) {
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
    document.addEventListener("keydown", close);
    document.addEventListener("pointerdown", close);
    return () => {
      document.removeEventListener("keydown", close);
      document.removeEventListener("pointerdown", close);
    };
  }, [menu]);
}

export function UserMenu({ user }: { user: Person }) {
  const menu = useRef<HTMLDetailsElement>(null);
  const [message, setMessage] = useState("");
  const [busy, setBusy] = useState(false);
  useClosing(menu);

  async function leave() {
    if (busy) return;
    setBusy(true);
    setMessage("");
    if (await signOut()) return window.location.assign(signInAddress());
    setBusy(false);
    setMessage("You are still signed in: Stillyard did not answer. Try again in a few seconds.");
  }

  return (
    <details ref={menu} className="relative">
      <summary
        aria-label={`Signed in as ${user.name}`}
        className="grid size-10 list-none place-items-center rounded-full border-[1.5px] border-edge text-second font-[650] hover:border-ink [&::-webkit-details-marker]:hidden"
      >
        <span aria-hidden="true">{initialsOf(user.name)}</span>
      </summary>
      <div className="absolute right-0 top-12 z-30 w-[min(18rem,calc(100vw-24px))] rounded-sheet border border-edge bg-sheet p-4">
        <p className="font-semibold break-words">{user.name}</p>
        <p className="mb-3 text-second break-words text-ink2">{user.email}</p>
        <LinkButton className="mb-2 w-full" href={accountAddress}>
          Your account
        </LinkButton>
        <Button className="w-full" onClick={leave} aria-disabled={busy || undefined}>
          Sign out
        </Button>
        <p role="alert" className="text-second font-semibold text-over not-empty:mt-2">
          {message}
        </p>
      </div>
    </details>
  );
}
