import type { ReactNode } from "react";
import { KeepFresh } from "../state/KeepFresh";
import { budgetAddress, projectsAddress, wallsAddress } from "../addresses";
import { Beam } from "./Beam";
import { Header } from "./Header";
import { Page } from "./Page";
import { PhoneBar } from "./PhoneBar";
import type { Stage } from "./stages";

export type YardStage = "walls" | "budget";

interface Props {
  project: { id: string; name: string; stage: string };
  user: { name: string; email: string; theme: "light" | "dark" | "system" };
  stage: YardStage;
  /** Of the plan the page shows. */
  revision: number;
  /** Where the skip link leads; the verdict if nothing is said. */
  skipTo?: string;
  skipWords?: string;
  children: ReactNode;
}

function stagesOf(projectId: string, current: YardStage): Stage[] {
  return [
    { href: wallsAddress(projectId), label: "Walls & openings", short: "Walls", current: current === "walls" },
    { href: budgetAddress(projectId), label: "Budget", current: current === "budget" },
  ];
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
      <Page bar>{children}</Page>
      <PhoneBar stages={stages} />
      <KeepFresh revision={revision} />
    </>
  );
}
