import type { Metadata } from "next";
import { limitLibrary } from "@/app/_server/limitLibrary";
import { openProjectPage } from "@/app/_server/projectPage";
import { limitsAddress, signInAddress } from "@/components/addresses";
import { YardFrame } from "@/components/frame/YardFrame";
import { LimitsDesk } from "@/components/limits/LimitsDesk";

export const dynamic = "force-dynamic";
export const metadata: Metadata = { title: "Limits" };

export default async function LimitsPage({ params }: { params: Promise<{ projectId: string }> }) {
  const { projectId } = await params;
  const { user, project, may, answer } = await openProjectPage(projectId, signInAddress(limitsAddress(projectId)));
  return (
    <YardFrame project={project} user={user} stage="limits" revision={answer.revision}>
      <LimitsDesk projectId={projectId} answer={answer} library={limitLibrary()} may={may} />
    </YardFrame>
  );
}
