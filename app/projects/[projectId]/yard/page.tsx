import type { Metadata } from "next";
import { sourceLibrary } from "@/app/_server/library";
import { openProjectPage } from "@/app/_server/projectPage";
import { signInAddress, yardAddress } from "@/components/addresses";
import { YardFrame } from "@/components/frame/YardFrame";
import { YardDesk } from "@/components/yard/YardDesk";

export const dynamic = "force-dynamic";
export const metadata: Metadata = { title: "Yard" };

export default async function YardPage({ params }: { params: Promise<{ projectId: string }> }) {
  const { projectId } = await params;
  const { user, project, may, answer } = await openProjectPage(projectId, signInAddress(yardAddress(projectId)));
  const condenser = sourceLibrary().find(({ kind }) => kind === "condenser");
  return (
    <YardFrame project={project} user={user} stage="yard" revision={answer.revision}>
      <YardDesk projectId={projectId} answer={answer} may={may} condenserKey={condenser?.key} />
    </YardFrame>
  );
}
