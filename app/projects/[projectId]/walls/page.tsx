import type { Metadata } from "next";
import { sheetsOf } from "@/app/_server/constructionSheets";
import { openProjectPage } from "@/app/_server/projectPage";
import { budgetAddress, elementAddress, signInAddress, wallsAddress } from "@/components/addresses";
import { YardFrame } from "@/components/frame/YardFrame";
import { leadOf } from "@/components/walls/answer";
import { VerdictStrip } from "@/components/walls/VerdictStrip";
import { WallIndex } from "@/components/walls/WallIndex";
import { wallFaces } from "@/components/walls/wallRows";

export const dynamic = "force-dynamic";
export const metadata: Metadata = { title: "Walls & openings" };

export default async function WallsPage({ params }: { params: Promise<{ projectId: string }> }) {
  const { projectId } = await params;
  const { user, project, answer } = await openProjectPage(projectId, signInAddress(wallsAddress(projectId)));
  const sheets = sheetsOf(answer.plan);
  const lead = leadOf(answer);
  return (
    <YardFrame project={project} user={user} stage="walls" revision={answer.revision}>
      <VerdictStrip answer={answer} projectId={projectId} budgetHref={budgetAddress(projectId)} />
      <h1 className="mb-4 text-verdictPhone leading-[1.12] mid:mb-5 desk:text-verdict">
        Walls &amp; openings
      </h1>
      <WallIndex
        faces={wallFaces(answer, sheets, (elementId) => elementAddress(projectId, elementId))}
        litBand={lead?.bandIndex ?? 1}
        listener={lead?.name}
      />
    </YardFrame>
  );
}
