import type { ReactNode } from "react";
import { capitalise, countWords, numberWord } from "../format";
import { commonScale } from "./PlanThumbnail";
import type { ProjectLine } from "./ProjectLine";
import { ProjectRow } from "./ProjectRow";

export type { ProjectLine } from "./ProjectLine";

interface Props {
  projects: readonly ProjectLine[];
  /** ISO; the moment the page was made. */
  now: string;
  timeZone: string;
  /** The yard left open last, with its verdict. */
  slab?: ReactNode;
  /** Button that makes a yard. */
  newYard?: ReactNode;
  after?: ReactNode;
}

const countState = (projects: readonly ProjectLine[], claim: (project: ProjectLine) => boolean): number => projects.filter(claim).length;

/** "Four yards. One is over its limit, one has changed since it was weighed." */
function summarise(projects: readonly ProjectLine[]): string {
  const over = countState(projects, ({ state }) => state === "over");
  const stale = countState(projects, ({ stale: changed }) => changed !== undefined);
  const parts = [
    over > 0 && `${numberWord(over)} ${over === 1 ? "is over its limit" : "are over their limits"}`,
    stale > 0 && `${numberWord(stale)} ${stale === 1 ? "has changed since it was weighed" : "have changed since they were weighed"}`,
  ].filter((part): part is string => part !== false);
  const head = `${capitalise(countWords(projects.length, "yard"))}.`;
  return parts.length > 0 ? `${head} ${capitalise(parts.join(", "))}.` : head;
}

/** The shape of the answer, before there is one. */
export function EmptyYards({ newYard }: { newYard?: ReactNode }) {
  return (
    <div className="flex flex-wrap items-center gap-7 rounded-sheet bg-sheet p-4 mid:p-7">
      <svg width="180" height="146" viewBox="0 0 180 146" aria-hidden="true" fill="none" className="block stroke-edge" strokeWidth="1.8">
        <rect x="2" y="2" width="176" height="142" strokeDasharray="8 6" />
        <rect x="18" y="18" width="56" height="56" strokeDasharray="4 4" />
        <path d="M76 56 122 84" strokeDasharray="3 5" />
        <circle cx="137" cy="95" r="17" strokeDasharray="4 4" />
      </svg>
      <div className="min-w-0 flex-[1_1_16rem]">
        <h2 className="text-section">No yard yet</h2>
        <p className="mb-4 mt-1 max-w-prose text-ink2">
          Start with the fence. Pace it out if you must: a metre either way changes little. Then the studio, then whoever might hear it.
        </p>
        {newYard}
      </div>
    </div>
  );
}

export function ProjectList({ projects, now, timeZone, slab, newYard, after }: Props) {
  const scale = commonScale(projects);
  return (
    <div className="flex flex-col gap-3 mid:gap-5">
      {slab}
      <div className="mt-2 flex flex-wrap items-end justify-between gap-x-6 gap-y-3 mid:mt-3">
        <div>
          <h1 id="yards" tabIndex={-1} className="text-verdictPhone mid:text-head">
            Your yards
          </h1>
          {projects.length > 0 && <p className="mt-1 text-ink2">{summarise(projects)}</p>}
        </div>
        {projects.length > 0 && newYard}
      </div>
      {projects.length === 0 ? (
        <EmptyYards newYard={newYard} />
      ) : (
        <ul className="overflow-hidden rounded-sheet bg-sheet">
          {projects.map((project) => (
            <ProjectRow key={project.id} project={project} scale={scale} now={now} timeZone={timeZone} />
          ))}
        </ul>
      )}
      {after}
    </div>
  );
}
