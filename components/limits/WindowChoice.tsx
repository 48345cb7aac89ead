"use client";

import { useId } from "react";
import type { Criterion } from "@/lib/noise/plan";
import { FieldError } from "../ui/FieldFrame";
import { windowWords } from "./limitWords";
import { useChosen } from "./useChosen";

type WindowState = NonNullable<Criterion["window"]>;

const STATES = ["shut", "ajar", "open"] as const;

/** The sash seen from above between two pieces of wall: in the wall, a hand's breadth out of it, wide open. */
const sashes: Record<WindowState, string> = { shut: "M24 12V44", ajar: "M24 12L32 42", open: "M24 12L50 30" };

function Sash({ state }: { state: WindowState }) {
  return (
    <svg width="56" height="56" viewBox="0 0 56 56" fill="none" aria-hidden="true" className="stroke-current">
      <path d="M24 2V12M24 44V54" strokeWidth="9" />
      <path d={sashes[state]} strokeWidth="3.5" strokeLinecap="round" />
      {state !== "shut" && <path d={state === "open" ? "M24 44A32 32 0 0 0 50 30" : "M24 44A32 32 0 0 0 32 42"} strokeWidth="1.2" strokeDasharray="2 2.5" />}
    </svg>
  );
}

interface Props {
  value: Criterion["window"];
  error?: string;
  onChoose: (value: Criterion["window"]) => void;
}

/** How the listener's window stands when the limit is taken. */
export function WindowChoice({ value, error, onChoose }: Props) {
  const id = useId();
  const [chosen, setChosen] = useChosen(value, error);
  function choose(next: Criterion["window"]) {
    setChosen(next);
    onChoose(next);
  }
  return (
    <fieldset className="min-w-0">
      <legend>
        <h2 className="text-part">Their window</h2>
      </legend>
      <p className="text-second text-ink2">Looked down on, as the clause has it.</p>
      <div className="mt-2 grid grid-cols-3 gap-2">
        {STATES.map((state) => (
          <label
            key={state}
            className="grid cursor-pointer justify-items-center gap-1 rounded-control border-[1.5px] border-edge px-1 py-2 font-semibold hover:border-ink has-checked:border-2 has-checked:border-ink has-checked:bg-lampwash has-focus-visible:outline-3 has-focus-visible:outline-offset-2 has-focus-visible:outline-lamp"
          >
            <input type="radio" name={id} checked={chosen === state} onChange={() => choose(state)} className="sr-only" />
            <Sash state={state} />
            {windowWords[state]}
          </label>
        ))}
      </div>
      <label className="mt-2 flex min-h-10 cursor-pointer items-center gap-2 text-second">
        <input type="radio" name={id} checked={chosen === null} onChange={() => choose(null)} className="size-5 accent-ink" />
        The clause does not say
      </label>
      <FieldError id={id} error={error} />
    </fieldset>
  );
}
