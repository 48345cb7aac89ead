"use client";

import { useRouter } from "next/navigation";
import { useState, type ReactNode } from "react";
import { budgetAddress, newProjectAddress } from "../addresses";
import { capitalise, countWords, numberWord } from "../format";
import { Icon } from "../marks/Icon";
import { Button, LinkButton } from "../ui/Button";
import { readBrowserPlace } from "./browserPlace";
import { EmptyYards } from "./EmptyYards";
import { FindField, ListTools } from "./ListTools";
import { OutcomeStrip } from "./OutcomeStrip";
import { Pages, type PageFacts } from "./Pages";
import { commonScale } from "./PlanThumbnail";
import type { ProjectLine } from "./ProjectLine";
import { ProjectRow } from "./ProjectRow";
import { useYardActs } from "./useYardActs";
import { useYardTable } from "./useYardTable";
import { useYardView } from "./useYardView";
import { SHOWS, type Show, type YardView } from "./yardView";
import { WorkedExample } from "./WorkedExample";

interface Props {
  projects: readonly ProjectLine[];
  /** ISO; the moment the page was made. */
  now: string;
  timeZone: string;
  view: YardView;
  facts: PageFacts;
  /** Whether the reader belongs to a team and can make yards. */
  mayMake: boolean;
  /** The yard left open last, with its verdict. */
  slab?: ReactNode;
}

const countState = (projects: readonly ProjectLine[], claim: (project: ProjectLine) => boolean): number => projects.filter(claim).length;

/** "Four yards. One is over its limit, one has changed since it was weighed." */
function summarise(projects: readonly ProjectLine[], count: number): string {
  const over = countState(projects, ({ state }) => state === "over");
  const stale = countState(projects, ({ stale: changed }) => changed !== undefined);
  const parts = [
    over > 0 && `${numberWord(over)} ${over === 1 ? "is over its limit" : "are over their limits"}`,
    stale > 0 && `${numberWord(stale)} ${stale === 1 ? "has changed since it was weighed" : "have changed since they were weighed"}`,
  ].filter((part): part is string => part !== false);
  const head = `${capitalise(countWords(count, "yard"))}.`;
  return parts.length > 0 ? `${head} ${capitalise(parts.join(", "))}.` : head;
}

/** How many each way of looking would show; of several pages nobody has counted the states. */
function countsOf(projects: readonly ProjectLine[], { inUse, archived, paged }: PageFacts, show: Show): Partial<Record<Show, number>> {
  const states = SHOWS.slice(1, -1).map((one) => [one, countState(projects, ({ state }) => state === one)] as const);
  return { all: inUse, archived, ...(!paged && show !== "archived" && Object.fromEntries(states)) };
}

/** Says why no line is there. */
function NothingFits({ view, onAll }: { view: YardView; onAll: () => void }) {
  const bare = view.show === "archived" && !view.words;
  return (
    <div role="status" className="flex flex-wrap items-center gap-x-4 gap-y-3 rounded-sheet bg-sheet p-4 mid:p-7">
      <p className="mr-auto text-ink2">{bare ? "No yard is archived." : view.words ? `No yard fits “${view.words}”.` : `No yard is ${view.show === "not weighed" ? "without a verdict" : view.show}.`}</p>
      <Button onClick={onAll}>Show all yards</Button>
    </div>
  );
}

export function ProjectList({ projects, now, timeZone, view: asked, facts, mayMake, slab }: Props) {
  const router = useRouter();
  const { view, look, find } = useYardView(asked, facts.paged);
  const acts = useYardActs(projects, router.refresh);
  const shown = useYardTable(acts.lines, view, facts.paged);
  const [copying, setCopying] = useState(false);
  const scale = commonScale(projects);
  const none = facts.inUse + facts.archived === 0;

  async function copyExample() {
    if (copying) return;
    setCopying(true);
    const id = await acts.copyExample({ name: "The worked example", says: "Drums in a shed at the back fence", ...readBrowserPlace() });
    if (id !== undefined) return router.push(budgetAddress(id));
    setCopying(false);
  }

  const newYard = mayMake && (
    <LinkButton look="ink" icon={<Icon name="plus" />} href={newProjectAddress}>
      New yard
    </LinkButton>
  );
  return (
    <div className="flex flex-col gap-3 mid:gap-5">
      {slab}
      <div className="mt-2 flex flex-wrap items-end justify-between gap-x-6 gap-y-3 mid:mt-3">
        <div className="min-w-0">
          <h1 id="yards" tabIndex={-1} className="text-verdictPhone mid:text-head">
            Your yards
          </h1>
          {!none && <p className="mt-1 text-ink2">{summarise(view.show === "archived" ? [] : acts.lines, facts.inUse)}</p>}
        </div>
        {!none && (
          <div className="flex min-w-0 flex-[1_1_18rem] flex-wrap justify-end gap-2.5 mid:flex-none">
            <FindField view={view} paged={facts.paged} look={look} find={find} />
            {newYard}
          </div>
        )}
      </div>
      {acts.outcome && <OutcomeStrip outcome={acts.outcome} onUndo={acts.setArchived} />}
      {none ? (
        <EmptyYards mayMake={mayMake} actions={newYard} />
      ) : (
        <>
          <ListTools view={view} counts={countsOf(acts.lines, facts, view.show)} look={look} />
          {shown.length > 0 ? (
            <ul className="rounded-sheet bg-sheet">
              {shown.map((project) => (
                <ProjectRow key={project.id} project={project} scale={scale} now={now} timeZone={timeZone} acts={acts} />
              ))}
            </ul>
          ) : (
            <NothingFits view={view} onAll={() => look({ show: "all", words: "" })} />
          )}
          {facts.paged && <Pages view={view} facts={facts} />}
        </>
      )}
      {mayMake && <WorkedExample busy={copying} onCopy={copyExample} />}
    </div>
  );
}
