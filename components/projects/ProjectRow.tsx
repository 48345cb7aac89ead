"use client";

import Link from "next/link";
import { useRef, useState } from "react";
import { bandWords, marginWords } from "../format";
import { Icon } from "../marks/Icon";
import { MarginWords } from "../marks/MarginWords";
import { SmallBeam } from "../marks/SmallBeam";
import { momentWords } from "../moments";
import { Tag } from "../ui/Tag";
import { ActionMenu } from "./ActionMenu";
import { PlanThumbnail } from "./PlanThumbnail";
import type { ProjectLine } from "./ProjectLine";
import { RenameField } from "./RenameField";
import type { YardActs } from "./useYardActs";

type RowActs = Pick<YardActs, "rename" | "copy" | "setArchived">;

interface Props {
  project: ProjectLine;
  scale: number;
  now: string;
  timeZone: string;
  acts: RowActs;
}

/** Which listener and band the margin belongs to, or what is missing. */
function placeWords({ state, was, margin, band, listenerName }: ProjectLine): string {
  if (state === "not weighed") {
    if (was && was !== "not weighed") return `was ${marginWords(was, margin)}`;
    return listenerName ? `at ${listenerName}` : "Add a listener to weigh it.";
  }
  const place = listenerName ? ` at ${listenerName}` : "";
  return band ? `${bandWords(band)}${place}` : place.trim();
}

function Verdict({ project }: { project: ProjectLine }) {
  const { state, was, margin, doubt } = project;
  return (
    <div className="min-w-0">
      <SmallBeam state={state === "not weighed" ? (was ?? state) : state} margin={margin} doubt={doubt} stale={state === "not weighed" && was !== undefined} />
      <p className="mt-1.5">
        <MarginWords state={state} margin={margin} />
      </p>
      <p className="text-second text-ink2">{placeWords(project)}</p>
    </div>
  );
}

function Progress({ project, now, timeZone }: Omit<Props, "scale" | "acts">) {
  const people = project.people.map(({ name, says }) => (says ? `${name} (${says})` : name)).join(", ");
  return (
    <div className="min-w-0 text-second text-ink2">
      <p className="text-table font-semibold text-ink">{project.stage}</p>
      <p>{project.weighedAt ? `Weighed ${momentWords(project.weighedAt, now, timeZone)}` : "Never weighed"}</p>
      {people && <p>{people}</p>}
      {project.stale && (
        <p className="mt-1.5">
          <Tag dashed icon={<Icon name="note" size={16} />}>
            Changed since: {project.stale}
          </Tag>
        </p>
      )}
    </div>
  );
}

/** What can be done with this yard; who may change nothing reads who may. */
function Menu({ project, acts, onRename }: { project: ProjectLine; acts: RowActs; onRename: () => void }) {
  const { may, archived } = project;
  const actions = [
    ...(may.rename && !archived ? [{ label: "Rename", act: onRename }] : []),
    ...(may.copy ? [{ label: "Duplicate", act: () => acts.copy(project) }] : []),
    ...(may.rename ? [{ label: archived ? "Restore" : "Archive", act: () => acts.setArchived(project, !archived) }] : []),
  ];
  const links = [{ label: "Open the budget", href: project.href }, { label: "Open the yard", href: project.yardHref }];
  return <ActionMenu label={`What can be done with ${project.name}`} links={links} actions={actions} reason={actions.length > 0 ? undefined : "You may look here; its team may rename, copy and archive it."} />;
}

function Name({ project }: { project: ProjectLine }) {
  return (
    <div className="min-w-0">
      <h2 className="text-part mid:text-section">
        <Link href={project.href} className="no-underline after:absolute after:inset-0 after:content-['']">
          {project.name}
        </Link>
      </h2>
      <p className="text-table text-ink2">{project.says}</p>
    </div>
  );
}

/** One yard; the name is the link, and the whole row answers to a press. */
export function ProjectRow({ project, scale, now, timeZone, acts }: Props) {
  const [renaming, setRenaming] = useState(false);
  const row = useRef<HTMLLIElement>(null);
  const close = () => {
    setRenaming(false);
    row.current?.querySelector("summary")?.focus();
  };
  return (
    <li ref={row} className="relative grid grid-cols-1 items-center gap-x-7 gap-y-4 border-t border-rule p-4 first:rounded-t-sheet first:border-t-0 last:rounded-b-sheet hover:bg-well mid:grid-cols-[140px_minmax(0,1fr)_228px] mid:p-7 desk:grid-cols-[140px_minmax(0,1.2fr)_228px_minmax(0,1fr)] wide:grid-cols-[140px_minmax(0,1.5fr)_228px_minmax(0,1.2fr)_24px]">
      <div className="flex items-center gap-4 pr-10 mid:contents">
        <div className="w-24 flex-none mid:w-[140px]">
          <PlanThumbnail project={project} scale={scale} />
        </div>
        {renaming ? <RenameField name={project.name} onRename={(name) => acts.rename(project, name)} onClose={close} /> : <Name project={project} />}
      </div>
      <Verdict project={project} />
      <div className="mid:col-span-2 mid:col-start-2 desk:col-span-1 desk:col-start-auto desk:pr-8 wide:pr-0">
        <Progress project={project} now={now} timeZone={timeZone} />
      </div>
      <span className="hidden wide:block">
        <Icon name="arrow" />
      </span>
      <div className="absolute right-2 top-2 mid:right-3 mid:top-3 wide:right-5">
        <Menu project={project} acts={acts} onRename={() => setRenaming(true)} />
      </div>
    </li>
  );
}
