import type { Metadata } from "next";
import { notFound } from "next/navigation";
import { libraryFor } from "@/app/_server/constructionSheets";
import { openProjectPage } from "@/app/_server/projectPage";
import { elementAddress, signInAddress } from "@/components/addresses";
import { YardFrame } from "@/components/frame/YardFrame";
import { WallDesk } from "@/components/walls/WallDesk";

export const dynamic = "force-dynamic";
export const metadata: Metadata = { title: "Walls & openings" };

interface Props {
  params: Promise<{ projectId: string; elementId: string }>;
}

export default async function ElementPage({ params }: Props) {
  const { projectId, elementId } = await params;
  const { user, project, may, answer } = await openProjectPage(
    projectId,
    signInAddress(elementAddress(projectId, elementId)),
  );
  const element = answer.plan.elements.find(({ id }) => id === elementId);
  if (!element) notFound();
  const library = libraryFor(answer.plan, element);
  return (
    <YardFrame project={project} user={user} stage="walls" revision={answer.revision}>
      <WallDesk projectId={projectId} elementId={elementId} answer={answer} library={library} may={may} />
    </YardFrame>
  );
}
