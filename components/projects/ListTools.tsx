"use client";

import clsx from "clsx";
import { useId, type FormEvent } from "react";
import { Icon } from "../marks/Icon";
import { inputClasses } from "../ui/FieldFrame";
import { Button } from "../ui/Button";
import { VisuallyHidden } from "../ui/VisuallyHidden";
import { ORDERS, SHOWS, yardViewAddress, type Order, type Show, type YardView } from "./yardView";

const showWords: Record<Show, string> = { all: "All", over: "Over", tight: "Tight", under: "Under", "not weighed": "Not weighed", archived: "Archived" };
const orderWords: Record<Order, string> = { changed: "Changed last", name: "Name", margin: "Worst margin" };

interface Props {
  view: YardView;
  counts: Partial<Record<Show, number>>;
  paged: boolean;
  look: (change: Partial<YardView>) => void;
  find: () => void;
}

/** A field for words; where there are several pages Enter looks through all of them. */
export function FindField({ view, paged, look, find }: Omit<Props, "counts">) {
  const id = useId();
  function submit(event: FormEvent) {
    event.preventDefault();
    if (paged) find();
  }
  return (
    <form role="search" onSubmit={submit} className="flex min-w-0 flex-[1_1_12rem] gap-2 mid:flex-none">
      <label htmlFor={id} className="relative block min-w-0 flex-1 text-ink2">
        <span className="pointer-events-none absolute inset-y-0 left-3 flex items-center">
          <Icon name="find" size={18} />
        </span>
        <VisuallyHidden>Find a yard</VisuallyHidden>
        <input
          id={id}
          type="search"
          name="words"
          placeholder="Find a yard"
          maxLength={120}
          autoComplete="off"
          value={view.words}
          onChange={(event) => look({ words: event.target.value })}
          className={clsx(inputClasses, "border-edge pl-10 hover:border-ink mid:w-60")}
        />
      </label>
      {paged && <Button type="submit">Find</Button>}
    </form>
  );
}

/** Which yards, as links that stand in the address; and in which order. */
export function ListTools({ view, counts, look }: Omit<Props, "paged" | "find">) {
  const orderId = useId();
  return (
    <div className="flex flex-wrap items-end justify-between gap-x-6 gap-y-2">
      <nav aria-label="Which yards" className="min-w-0">
        <ul className="flex flex-wrap gap-x-4 gap-y-1">
          {SHOWS.map((show) => (
            <li key={show}>
              <a
                href={yardViewAddress({ ...view, show, page: 1 })}
                aria-current={view.show === show ? "true" : undefined}
                onClick={(event) => {
                  if (event.metaKey || event.ctrlKey || event.shiftKey) return;
                  event.preventDefault();
                  look({ show });
                }}
                className={clsx(
                  "inline-flex min-h-9 items-center gap-1.5 border-b-[3px] text-table no-underline",
                  view.show === show ? "border-ink font-bold text-ink" : "border-transparent font-medium text-ink2 hover:border-rule hover:text-ink",
                )}
              >
                {`${showWords[show]} `}
                {counts[show] !== undefined && <span className="font-medium text-ink3">{counts[show]}</span>}
              </a>
            </li>
          ))}
        </ul>
      </nav>
      <div className="flex items-center gap-2.5">
        <label htmlFor={orderId} className="text-second font-semibold text-ink2">
          Order
        </label>
        <div className="relative">
          <select
            id={orderId}
            value={view.order}
            onChange={(event) => look({ order: event.target.value as Order })} // one of the options below
            className={clsx(inputClasses, "appearance-none border-edge pr-10 hover:border-ink")}
          >
            {ORDERS.map((order) => (
              <option key={order} value={order}>
                {orderWords[order]}
              </option>
            ))}
          </select>
          <span className="pointer-events-none absolute inset-y-0 right-3 flex items-center text-ink2">
            <Icon name="fold" size={18} />
          </span>
        </div>
      </div>
    </div>
  );
}
