import type { Metadata } from "next";
import { listProjects, type ListedProject } from "@/app/_server/projectList";
import { requirePageReader } from "@/app/_server/projectPage";
import { teamsOfPage } from "@/app/_server/teams";
import { budgetAddress, projectsAddress, signInAddress, yardAddress } from "@/components/addresses";
import { Header } from "@/components/frame/Header";
import { Page } from "@/components/frame/Page";
import { briefReadingOf } from "@/components/projects/briefReadingOf";
import { projectLineOf } from "@/components/projects/projectLineOf";
import { ProjectList } from "@/components/projects/ProjectList";
import { readYardView } from "@/components/projects/yardView";
import { LinkButton } from "@/components/ui/Button";
import { NightSlab } from "@/components/verdict/NightSlab";

export const dynamic = "force-dynamic";
export const metadata: Metadata = { title: "Your yards" };

type Asked = Record<string, string | string[] | undefined>;

export default async function ProjectsPage({ searchParams }: { searchParams: Promise<Asked> }) {
  const reader = await requirePageReader(signInAddress(projectsAddress));
  const asked = await searchParams;
  const view = readYardView((name) => [asked[name]].flat()[0]);
  const order = view.order === "name" ? "name" : "changed";
  const { listed, ...facts } = await listProjects(reader, { archived: view.show === "archived", page: view.page, words: view.words, order });
  const last = listed.toSorted((one, other) => other.changedAt.getTime() - one.changedAt.getTime())[0];
  return (
    <>
      <Header theme={reader.theme === "system" ? undefined : reader.theme} user={{ name: reader.name, email: reader.email }} skipTo="#yards" skipWords="Skip to your yards" />
      <Page>
        <ProjectList
          projects={listed.map(projectLineOf)}
          now={new Date().toISOString()}
          timeZone={last?.project.timeZone ?? "UTC"}
          view={view}
          facts={facts}
          mayMake={(await teamsOfPage(reader)).length > 0}
          slab={last && view.show !== "archived" && facts.page === 1 && <LastYard listed={last} />}
        />
      </Page>
    </>
  );
}

/** The yard that was changed last, with its verdict. */
function LastYard({ listed: { project, answer } }: { listed: ListedProject }) {
  const reading = briefReadingOf(answer);
  return (
    <NightSlab
      reading={reading}
      place={project.name}
      headingLevel={2}
      actions={
        <LinkButton look="lamp" href={(reading ? budgetAddress : yardAddress)(project.id)}>
          {reading ? "Open the budget" : "Open the yard"}
        </LinkButton>
      }
    />
  );
}
