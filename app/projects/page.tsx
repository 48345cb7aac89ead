import type { Metadata } from "next";
import { listProjects, type ListedProject } from "@/app/_server/projectList";
import { requirePageReader } from "@/app/_server/projectPage";
import { budgetAddress, projectsAddress, signInAddress } from "@/components/addresses";
import { Header } from "@/components/frame/Header";
import { Page } from "@/components/frame/Page";
import { projectLineOf } from "@/components/projects/projectLineOf";
import { ProjectList } from "@/components/projects/ProjectList";
import { LinkButton } from "@/components/ui/Button";
import { NightSlab } from "@/components/verdict/NightSlab";
import { briefReadingOf } from "@/components/projects/briefReadingOf";

export const dynamic = "force-dynamic";
export const metadata: Metadata = { title: "Your yards" };

export default async function ProjectsPage() {
  const reader = await requirePageReader(signInAddress(projectsAddress));
  const listed = await listProjects(reader);
  const [last] = listed;
  return (
    <>
      <Header theme={reader.theme === "system" ? undefined : reader.theme} user={{ name: reader.name, email: reader.email }} skipTo="#yards" skipWords="Skip to your yards" />
      <Page>
        <ProjectList
          projects={listed.map(projectLineOf)}
          now={new Date().toISOString()}
          timeZone={last?.project.timeZone ?? "UTC"}
          slab={last && <LastYard listed={last} />}
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
        <LinkButton look="lamp" href={budgetAddress(project.id)}>
          {reading ? "Open the budget" : "Open the yard"}
        </LinkButton>
      }
    />
  );
}
