import type { ReactNode } from "react";
import { KeepFresh } from "../state/KeepFresh";
import { budgetAddress, limitsAddress, projectsAddress, roomsAddress, sourcesAddress, wallsAddress, yardAddress } from "../addresses";
import { FiguresProvider, type Figures } from "../ui/figures";
import { Beam } from "./Beam";
import { Header } from "./Header";
import { Page } from "./Page";
import { PhoneBar } from "./PhoneBar";
import type { Stage } from "./stages";

/** Stages of a yard in the order of the beam; any may be visited first. */
const STAGES = [
  { key: "yard", label: "Yard", address: yardAddress },
  { key: "rooms", label: "Rooms", address: roomsAddress },
  { key: "sources", label: "Sources", address: sourcesAddress },
  { key: "walls", label: "Walls & openings", short: "Walls", address: wallsAddress },
  { key: "limits", label: "Limits", address: limitsAddress },
  { key: "budget", label: "Budget", address: budgetAddress },
] as const;
export type YardStage = (typeof STAGES)[number]["key"];

interface Props {
  project: { id: string; name: string; stage: string };
  user: { name: string; email: string; theme: "light" | "dark" | "system"; figures: Figures };
  stage: YardStage;
  /** Of the plan the page shows. */
  revision: number;
  /** Where the skip link leads; the verdict if nothing is said. */
  skipTo?: string;
  skipWords?: string;
  children: ReactNode;
}

function stagesOf(projectId: string, current: YardStage): Stage[] {
  return STAGES.map(({ key, label, address, ...names }) => ({ href: address(projectId), label, ...names, current: key === current }));
}

/** Head, beam and page of every stage of a yard. */
export function YardFrame({ project, user, stage, revision, skipTo, skipWords, children }: Props) {
  const stages = stagesOf(project.id, stage);
  return (
    <>
      <Header
        theme={user.theme === "system" ? undefined : user.theme}
        user={{ name: user.name, email: user.email }}
        crumb={{ name: project.name, says: project.stage }}
        home={projectsAddress}
        skipTo={skipTo}
        skipWords={skipWords}
      >
        <Beam stages={stages} />
      </Header>
      <Page bar>
        <FiguresProvider value={user.figures}>{children}</FiguresProvider>
      </Page>
      <PhoneBar stages={stages} />
      <KeepFresh revision={revision} />
    </>
  );
}
