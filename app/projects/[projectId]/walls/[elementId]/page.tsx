import type { Metadata } from "next";
import { notFound } from "next/navigation";
import { openProjectPage } from "@/app/_server/projectPage";
import { elementAddress, signInAddress } from "@/components/addresses";
import { YardFrame } from "@/components/frame/YardFrame";
import { WallDesk } from "@/components/walls/WallDesk";
import { catalogueSheets } from "@/lib/noise/catalogueSheets";
import type { Plan } from "@/lib/noise/plan";
import { sheetOf } from "@/lib/noise/sheet";

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
  const library = { own: ownSheets(answer.plan, element), catalogue: catalogueSheets(element) };
  return (
    <YardFrame project={project} user={user} stage="walls" revision={answer.revision}>
      <WallDesk projectId={projectId} elementId={elementId} answer={answer} library={library} may={may} />
    </YardFrame>
  );
}

/** Constructions of the yard that the page may have to name or draw: what stands there, and what would fit. */
function ownSheets({ constructions }: Plan, { kind, constructionId }: Plan["elements"][number]) {
  return constructions
    .filter(({ id, fits }) => id === constructionId || fits.some((fitting) => fitting === kind))
    .map((construction) => sheetOf(construction));
}
