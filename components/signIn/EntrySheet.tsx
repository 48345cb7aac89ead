import type { ReactNode } from "react";
import type { LandingBuild } from "../landing/LandingBuild";
import { ExampleCut } from "./ExampleCut";

interface Props {
  heading: string;
  example: LandingBuild;
  children: ReactNode;
  links?: ReactNode;
}

/** The form beside the example; on the phone the form comes first. */
export function EntrySheet({ heading, example, children, links }: Props) {
  return (
    <div className="grid grid-cols-1 overflow-hidden rounded-sheet desk:grid-cols-[minmax(0,1.1fr)_minmax(0,1fr)] wide:grid-cols-[minmax(0,1.45fr)_minmax(0,1fr)]">
      <section className="bg-sheet p-4 mid:p-8 desk:order-2 wide:px-10 wide:py-9" aria-labelledby="entry">
        <h1 id="entry" tabIndex={-1} className="mb-4 text-head mid:text-verdictDesk">
          {heading}
        </h1>
        {children}
        {links && <div className="mt-4 flex flex-wrap justify-between gap-x-4 gap-y-1 text-table">{links}</div>}
      </section>
      <section className="on-slab flex flex-col justify-between gap-6 p-4 max-desk:mt-3 max-desk:rounded-sheet mid:p-7 desk:order-1 wide:p-9" aria-label="An example">
        <p className="figure text-section font-[620] mid:text-head">Weigh it before you build it.</p>
        <ExampleCut build={example} />
      </section>
    </div>
  );
}
