import { projectRead, projectRoute } from "@/app/_server/projectRoute";
import { answerOf, readUnlessKept } from "@/app/_server/projects";
import { changeProject } from "@/app/_server/changeProject";

type Params = { projectId: string };

export const GET = projectRead<Params>("open project", async ({ opened: { project }, transaction }) => {
  const stored = await readUnlessKept(project, transaction);
  return () => answerOf(project, stored);
});

export const PATCH = projectRoute<Params>("rename project", changeProject);
