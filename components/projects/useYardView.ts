"use client";

import { useRouter, useSearchParams } from "next/navigation";
import { useState } from "react";
import { needsOthers, readYardView, yardViewAddress, type YardView } from "./yardView";

interface Looking {
  view: YardView;
  /** Changes the view; the address follows at once, the yards only where others are needed. */
  look: (change: Partial<YardView>) => void;
  /** Words are typed without asking the server for each letter; `find` asks. */
  find: () => void;
}

interface Held {
  view: YardView;
  /** Addresses written here that the router has not come to yet: it follows a fast typist some letters behind. */
  written: readonly string[];
}

/** The view when the address has become `here`: our own word coming back changes nothing, anybody else's is followed. */
function followed({ view, written }: Held, here: YardView): Held {
  const at = written.indexOf(yardViewAddress(here));
  return at >= 0 ? { view, written: written.slice(at + 1) } : { view: here, written: [] };
}

/** The view of the list, kept in the address so that it can be sent and gone back to. */
export function useYardView(initial: YardView, paged: boolean): Looking {
  const router = useRouter();
  const asked = useSearchParams();
  const [seen, setSeen] = useState(asked);
  const [held, setHeld] = useState<Held>({ view: initial, written: [] });
  if (asked !== seen) {
    setSeen(asked);
    setHeld(followed(held, readYardView((name) => asked.get(name))));
  }
  const { view } = held;

  function look(change: Partial<YardView>) {
    const next = { ...view, page: 1, ...change };
    const typing = paged && change.words !== undefined;
    // Other yards come with their own view, so that no yard ever stands under a heading that is not its own.
    if (!typing && needsOthers(view, next, paged)) return router.replace(yardViewAddress(next), { scroll: false });
    const address = yardViewAddress(next);
    const moves = !typing && address !== `${window.location.pathname}${window.location.search}`;
    setHeld({ view: next, written: moves ? [...held.written, address] : held.written });
    if (moves) window.history.replaceState(null, "", address);
  }

  return { view, look, find: () => router.replace(yardViewAddress({ ...view, page: 1 }), { scroll: false }) };
}
