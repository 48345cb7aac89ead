"use client";

import { useRef, useState, type ReactNode } from "react";
import type { Answered } from "../signIn/ask";
import { PasswordAgain } from "./PasswordAgain";

type Act = () => Promise<Answered>;
interface Held {
  act: Act;
  about: string;
  resolve: (answered: Answered | undefined) => void;
}

/**
 * Does what may ask for the password again: where the server says so, the dialog opens, and the act is repeated once the
 * password was given. Undefined where the reader would rather not.
 */
export function useProof(): [(about: string, act: Act) => Promise<Answered | undefined>, ReactNode] {
  const held = useRef<Held>(undefined);
  const [about, setAbout] = useState<string>();

  async function prove(words: string, act: Act): Promise<Answered | undefined> {
    const first = await act();
    if (first.kind !== "refused" || first.code !== "reauthenticate") return first;
    return new Promise((resolve) => {
      held.current = { act, about: words, resolve };
      setAbout(words);
    });
  }

  function letGo(): Held | undefined {
    const waiting = held.current;
    held.current = undefined;
    setAbout(undefined);
    return waiting;
  }

  async function repeat() {
    const waiting = letGo();
    waiting?.resolve(await waiting.act());
  }

  const dialog = <PasswordAgain open={about !== undefined} about={about ?? ""} onProved={repeat} onClose={() => letGo()?.resolve(undefined)} />;
  return [prove, dialog];
}
