import { LinkButton } from "../ui/Button";
import { yardViewAddress, type YardView } from "./yardView";

export interface PageFacts {
  page: number;
  pages: number;
  /** How many fit the words, over all pages. */
  found: number;
  inUse: number;
  archived: number;
  paged: boolean;
}

const SIZE = 100;

/** Where there are more yards than one page holds: which of them these are, and the way to the others. */
export function Pages({ view, facts: { page, pages, found } }: { view: YardView; facts: PageFacts }) {
  const first = (page - 1) * SIZE + 1;
  const at = (number: number) => yardViewAddress({ ...view, page: number });
  return (
    <nav aria-label="Pages" className="flex flex-wrap items-center gap-x-4 gap-y-2 text-second text-ink2">
      <p className="mr-auto">
        Yards {first} to {Math.min(found, page * SIZE)} of {found}. Margins are compared within this page.
      </p>
      {page > 1 && <LinkButton href={at(page - 1)}>Page {page - 1}</LinkButton>}
      {page < pages && <LinkButton href={at(page + 1)}>Page {page + 1}</LinkButton>}
    </nav>
  );
}
