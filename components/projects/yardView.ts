import { projectsAddress } from "../addresses";
import type { State } from "../format";

export const SHOWS = ["all", "over", "tight", "under", "not weighed", "archived"] as const;
export type Show = (typeof SHOWS)[number];
export const ORDERS = ["changed", "name", "margin"] as const;
export type Order = (typeof ORDERS)[number];

/** How the list of yards is looked at: all of it stands in the address. */
export interface YardView {
  words: string;
  show: Show;
  order: Order;
  /** From 1. */
  page: number;
}

type Given = (name: string) => string | null | undefined;

const oneOf = <T extends string>(known: readonly T[], text: string | null | undefined): T => known.find((one) => one === text) ?? known[0]!;

/** The view that an address asks for; what cannot be read is as if it were not there. */
export function readYardView(given: Given): YardView {
  const page = Number(given("page"));
  return {
    words: (given("words") ?? "").slice(0, 120),
    show: oneOf(SHOWS, given("show")),
    order: oneOf(ORDERS, given("order")),
    page: Number.isInteger(page) && page >= 1 && page < 1e6 ? page : 1,
  };
}

/** The address of a view; what is as usual is left out. */
export function yardViewAddress({ words, show, order, page }: YardView): string {
  const parts = new URLSearchParams();
  if (words) parts.set("words", words);
  if (show !== "all") parts.set("show", show);
  if (order !== "changed") parts.set("order", order);
  if (page > 1) parts.set("page", `${page}`);
  return parts.size > 0 ? `${projectsAddress}?${parts}` : projectsAddress;
}

export const isState = (show: Show): show is State => show !== "all" && show !== "archived";

/**
 * Whether another view needs other yards than those at hand: the archived ones or the ones in use, another page, or, where
 * there are several pages, other words or another order of all of them.
 */
export function needsOthers(now: YardView, next: YardView, paged: boolean): boolean {
  if (now.page !== next.page || (now.show === "archived") !== (next.show === "archived")) return true;
  return paged && (now.words !== next.words || now.order !== next.order);
}
