"use client";

import clsx from "clsx";
import type { Plan, Receiver } from "@/lib/noise/plan";
import type { Verdict } from "@/lib/noise/verdict";
import { bandWords, marginWords } from "../format";
import { MarginWords } from "../marks/MarginWords";
import { useRoving } from "../verdict/useRoving";

interface Props {
  plan: Plan;
  verdict: Verdict;
  lit: Receiver | undefined;
  onLight: (id: string) => void;
}

interface Line {
  receiver: Receiver;
  state: Verdict["receivers"][number]["state"];
  margin: number | null;
  where: string;
  limits: string;
}

function linesOf({ receivers, criteria }: Plan, verdict: Verdict): Line[] {
  return receivers.map((receiver) => {
    const weighed = verdict.receivers.find(({ receiverId }) => receiverId === receiver.id);
    const own = criteria.filter(({ receiverId }) => receiverId === receiver.id);
    const leading = own.find(({ id }) => id === weighed?.criterionId) ?? own[0];
    const more = own.length > 1 ? `, and ${own.length - 1} more` : "";
    return {
      receiver,
      state: weighed?.state ?? "not weighed",
      margin: weighed?.margin ?? null,
      where: weighed?.band && !weighed.weighted ? `at ${bandWords(weighed.band)}` : "",
      limits: leading ? leading.name + more : "no limit yet",
    };
  });
}

/** Who listens, each with the mark of its verdict and the limit it is weighed against. One tab stop; arrows move the lit row. */
export function ListenersPanel({ plan, verdict, lit, onLight }: Props) {
  const lines = linesOf(plan, verdict);
  const at = lines.findIndex(({ receiver }) => receiver.id === lit?.id);
  const { list, onKeyDown } = useRoving({ items: lines, lit: at, onLight: ({ receiver }) => onLight(receiver.id) });
  return (
    <ul ref={list} role="listbox" aria-label="Who listens" onKeyDown={onKeyDown} className="mid:max-wide:grid mid:max-wide:grid-cols-2">
      {lines.map(({ receiver, state, margin, where, limits }, index) => (
        <li
          key={receiver.id}
          role="option"
          aria-selected={index === at}
          aria-label={`${receiver.name}, ${limits}, ${marginWords(state, margin)} ${where}`.trim()}
          tabIndex={index === Math.max(0, at) ? 0 : -1}
          onClick={() => onLight(receiver.id)}
          className={clsx(
            "min-w-0 cursor-pointer border-t border-rule px-4 py-2.5 -outline-offset-2 focus-visible:outline-2 focus-visible:outline-ink mid:px-6.5",
            index === at ? "bg-lampwash shadow-[inset_6px_0_0_var(--lamp)]" : "hover:bg-well",
          )}
        >
          <p className="font-semibold wrap-anywhere">{receiver.name}</p>
          <p className="text-second text-ink2 wrap-anywhere">{limits}</p>
          <p className="flex flex-wrap items-center gap-x-1.5 text-second text-ink2">
            <MarginWords state={state} margin={margin} />
            {where}
          </p>
        </li>
      ))}
    </ul>
  );
}
