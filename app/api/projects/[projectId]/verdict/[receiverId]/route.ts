import { projectRead } from "@/app/_server/projectRoute";
import { receiverVerdictOf } from "@/app/_server/projects";
import { readPlan } from "@/models/parts";

type Params = { projectId: string; receiverId: string };

export const GET = projectRead<Params>("open project", async ({ params, opened: { project }, transaction }) => {
  const stored = await readPlan(project.id, transaction);
  return () => receiverVerdictOf(stored, params.receiverId);
});
