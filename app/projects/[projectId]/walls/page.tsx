import type { Metadata } from "next";
import { sheetsOf } from "@/app/_server/constructionSheets";
import { elementKindChoices } from "@/app/_server/library";
import { openProjectPage } from "@/app/_server/projectPage";
import { signInAddress, wallsAddress } from "@/components/addresses";
import { YardFrame } from "@/components/frame/YardFrame";
import { WallsDesk } from "@/components/walls/WallsDesk";

export const dynamic = "force-dynamic";
export const metadata: Metadata = { title: "Walls & openings" };

export default async function WallsPage({ params }: { params: Promise<{ projectId: string }> }) {
  const { projectId } = await params;
  const { user, project, may, answer } = await openProjectPage(projectId, signInAddress(wallsAddress(projectId)));
  return (
    <YardFrame project={project} user={user} stage="walls" revision={answer.revision}>
      <WallsDesk projectId={projectId} answer={answer} may={may} sheets={sheetsOf(answer.plan)} kinds={elementKindChoices()} />
    </YardFrame>
  );
}
