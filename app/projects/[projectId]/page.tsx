import type { Metadata } from "next";
import { openProjectPage } from "@/app/_server/projectPage";
import { budgetAddress, signInAddress } from "@/components/addresses";
import { Desk } from "@/components/Desk";
import { YardFrame } from "@/components/frame/YardFrame";

export const dynamic = "force-dynamic";
export const metadata: Metadata = { title: "Budget" };

export default async function BudgetPage({ params }: { params: Promise<{ projectId: string }> }) {
  const { projectId } = await params;
  const { user, project, may, roles, answer } = await openProjectPage(projectId, signInAddress(budgetAddress(projectId)));
  return (
    <YardFrame project={project} user={user} stage="budget" revision={answer.revision}>
      <Desk projectId={projectId} answer={answer} mayEdit={may.edit} doubtsFirst={roles.includes("acoustician")} />
    </YardFrame>
  );
}
