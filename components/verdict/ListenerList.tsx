"use client";

import clsx from "clsx";
import type { Receiver } from "@/lib/noise/plan";
import type { ReceiverVerdict } from "@/lib/noise/verdict";
import { bandWords, formatNumber, marginWords } from "../format";
import { MarginWords } from "../marks/MarginWords";
import { SmallBeam } from "../marks/SmallBeam";
import { useWidthClass } from "../ui/useWidthClass";
import type { WidthClass } from "../ui/widthClass";
import { lowestIsWorse } from "./notesWords";
import { useRoving } from "./useRoving";

export interface Listener {
  receiver: Receiver;
  weighed: ReceiverVerdict;
}

interface Props {
  listeners: readonly Listener[];
  litId: string | null;
  onLight: (receiverId: string) => void;
  /** Enter: on to the verdict of the lit listener. */
  onOpen: () => void;
}

const beamWidths: Record<WidthClass, number> = { 390: 312, 720: 250, 1024: 320, 1440: 214 };

const whereWords = ({ metric, band }: ReceiverVerdict): string =>
  metric === "dBA" || metric === "dBC" ? `in ${metric === "dBC" ? "dB(C)" : "dB(A)"}` : band === null ? "" : `at ${bandWords(band)}`;

function spokenRow({ receiver, weighed }: Listener): string {
  return [receiver.name, marginWords(weighed.state, weighed.margin), whereWords(weighed)].filter(Boolean).join(", ");
}

function Row({ listener, lit, tabbable, onLight }: { listener: Listener; lit: boolean; tabbable: boolean; onLight: () => void }) {
  const { receiver, weighed } = listener;
  const width = beamWidths[useWidthClass()];
  return (
    <li
      role="option"
      aria-selected={lit}
      aria-label={spokenRow(listener)}
      tabIndex={tabbable ? 0 : -1}
      onClick={onLight}
      className={clsx("cursor-pointer border-t border-rule px-4 py-2.5 -outline-offset-2 focus-visible:outline-2 focus-visible:outline-ink mid:px-6.5", lit ? "bg-lampwash shadow-[inset_6px_0_0_var(--lamp)]" : "hover:bg-well")}
    >
      <p className="font-semibold">{receiver.name}</p>
      <div className="mt-1.5">
        <SmallBeam state={weighed.state} margin={weighed.margin} doubt={weighed.doubt} width={width} />
      </div>
      <p className="mt-0.5 flex flex-wrap items-baseline justify-between gap-x-3">
        <MarginWords state={weighed.state} margin={weighed.margin} />
        <span className="text-second text-ink3">{whereWords(weighed)}</span>
      </p>
      {lowestIsWorse(weighed) && weighed.lowest && (
        <p className="flex flex-wrap items-baseline justify-between gap-x-3 text-second">
          <MarginWords state={weighed.lowest.state} margin={weighed.lowest.margin} />
          <span className="text-ink3">at 31.5 Hz, shown only</span>
        </p>
      )}
    </li>
  );
}

/** The marks in words, with the doubt of the lit listener: no round figure stands in for it. */
function Legend({ doubt }: { doubt: number | null }) {
  const by = doubt === null ? "its doubt" : `${formatNumber(doubt, doubt < 9.95 ? 1 : 0)} dB`;
  return (
    <div className="border-t border-rule px-4 pb-4 pt-3.5 text-second mid:px-6.5 mid:pb-6">
      <ul className="grid gap-1.5">
        <li><MarginWords state="under" className="font-normal"><span className="text-ink2">under: {by} or more to spare</span></MarginWords></li>
        <li><MarginWords state="tight" className="font-normal"><span className="text-ink2">tight: under, by less than {by}</span></MarginWords></li>
        <li><MarginWords state="over" className="font-normal"><span className="text-ink2">over: above the limit</span></MarginWords></li>
      </ul>
      <p className="mt-3 text-least text-ink3">
        Each notch is 1 dB, the pivot is the limit. The pale band is the doubt: how far the estimate may be out{doubt === null ? "" : `, ${by} for the lit listener where its verdict is taken; every band has its own`}.
      </p>
    </div>
  );
}

/** Everybody who hears it, one beam each: one tab stop, arrows move the lit row, the charts follow. */
export function ListenerList({ listeners, litId, onLight, onOpen }: Props) {
  const lit = listeners.findIndex(({ receiver }) => receiver.id === litId);
  const { list, onKeyDown } = useRoving({
    items: listeners,
    lit,
    onLight: ({ receiver }) => onLight(receiver.id),
    onEnter: onOpen,
  });
  return (
    <>
      <ul ref={list} role="listbox" aria-label="Who is listening" onKeyDown={onKeyDown}>
        {listeners.map((listener, index) => (
          <Row key={listener.receiver.id} listener={listener} lit={index === lit} tabbable={index === Math.max(0, lit)} onLight={() => onLight(listener.receiver.id)} />
        ))}
      </ul>
      <Legend doubt={listeners[lit]?.weighed.doubt ?? null} />
    </>
  );
}
