import type { Metadata } from "next";
import { sourceKindChoices, sourceLibrary } from "@/app/_server/library";
import { openProjectPage } from "@/app/_server/projectPage";
import { sourceFigures } from "@/app/_server/sourceFigures";
import { signInAddress, sourcesAddress } from "@/components/addresses";
import { YardFrame } from "@/components/frame/YardFrame";
import { SourcesDesk } from "@/components/sources/SourcesDesk";

export const dynamic = "force-dynamic";
export const metadata: Metadata = { title: "Sources" };

export default async function SourcesPage({ params }: { params: Promise<{ projectId: string }> }) {
  const { projectId } = await params;
  const { user, project, may, answer } = await openProjectPage(projectId, signInAddress(sourcesAddress(projectId)));
  return (
    <YardFrame project={project} user={user} stage="sources" revision={answer.revision}>
      <SourcesDesk projectId={projectId} answer={answer} library={sourceLibrary()} kinds={sourceKindChoices()} may={may} {...sourceFigures()} />
    </YardFrame>
  );
}
